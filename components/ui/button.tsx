import type { ComponentProps, ReactNode } from 'react';
import { buttonStyle, type ButtonSize, type ButtonTone } from './button-style';
import { classNames } from './class-names';
import { Icon, type IconName } from './icon';

interface ButtonProps extends Omit<ComponentProps<'button'>, 'disabled'> {
  readonly tone?: ButtonTone;
  readonly size?: ButtonSize;
  readonly icon?: IconName;
  /** Works on it: the width stays, the foot is stepped, further presses do nothing. */
  readonly busy?: boolean;
  /** Why it cannot be pressed now. The caller shows the reason beside it too, or sets `reasonBeside`. */
  readonly refused?: string | null;
  readonly reasonBeside?: boolean;
  readonly children: ReactNode;
}

/** A push button. It never loses its place or the focus: refused and busy stay focusable and say why. */
export function Button({ tone = 'plain', size = 'regular', icon, busy = false, refused, reasonBeside = false, className, children, onClick, type = 'button', ...rest }: ButtonProps) {
  const stopped = busy || Boolean(refused);
  const button = (
    <button
      {...rest}
      type={type}
      aria-disabled={stopped || undefined}
      aria-busy={busy || undefined}
      title={refused ?? rest.title}
      onClick={stopped ? (event) => event.preventDefault() : onClick}
      className={classNames(buttonStyle(tone, size, { refused: Boolean(refused) }), busy && 'stepped-foot cursor-progress', className)}
    >
      {refused ? <Icon name="lock" /> : icon ? <Icon name={icon} /> : null}
      {children}
    </button>
  );
  if (!refused || !reasonBeside) return button;
  return (
    <span className="inline-flex flex-wrap items-center gap-x-3 gap-y-1">
      {button}
      <span className="text-xs text-silk-2">{refused}</span>
    </span>
  );
}

interface IconButtonProps extends Omit<ComponentProps<'button'>, 'children' | 'disabled'> {
  readonly icon: IconName;
  readonly label: string;
  readonly tone?: ButtonTone;
  readonly size?: ButtonSize;
  readonly refused?: boolean;
}

/** A square button whose name is spoken and shown as its title. */
export function IconButton({ icon, label, tone = 'flat', size = 'regular', refused = false, className, onClick, ...rest }: IconButtonProps) {
  return (
    <button
      type="button"
      {...rest}
      aria-label={label}
      title={label}
      aria-disabled={refused || undefined}
      onClick={refused ? undefined : onClick}
      className={classNames(buttonStyle(tone, size, { refused, square: true }), className)}
    >
      <Icon name={icon} />
    </button>
  );
}
