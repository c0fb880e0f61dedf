import { classNames } from './class-names';

export type ButtonTone = 'plain' | 'primary' | 'sign' | 'danger' | 'warn' | 'flat';
export type ButtonSize = 'small' | 'regular' | 'large';

const base = 'relative inline-flex items-center justify-center rounded-key border font-cond font-semibold uppercase tracking-[.05em] whitespace-nowrap leading-none transition-colors duration-(--quick) max-tablet:min-h-target max-tablet:min-w-target';

const tones: Readonly<Record<ButtonTone, string>> = {
  plain: 'border-edge bg-key text-silk hover:bg-key-hi active:bg-sunk',
  primary: 'border-act bg-act text-on-act hover:bg-[color-mix(in_srgb,var(--act),var(--shade)_16%)]',
  sign: 'border-signed bg-signed text-on-signed hover:bg-[color-mix(in_srgb,var(--signed),var(--shade)_16%)]',
  danger: 'border-stop bg-stop text-on-stop hover:bg-[color-mix(in_srgb,var(--stop),var(--shade)_16%)]',
  warn: 'border-stop bg-transparent text-stop-ink hover:bg-stop hover:text-on-stop',
  flat: 'border-transparent bg-transparent text-silk hover:bg-key',
};

const sizes: Readonly<Record<ButtonSize, string>> = {
  small: 'h-7 gap-1.5 px-2.5 text-xs',
  regular: 'h-[30px] gap-[7px] px-[11px] text-sm max-tablet:text-body',
  large: 'h-10 gap-2 px-[18px] text-body',
};

const refused = 'cursor-not-allowed border-dashed border-edge bg-transparent text-silk-2 hover:bg-transparent';

/** One look for buttons and for links that act as one. */
export function buttonStyle(tone: ButtonTone, size: ButtonSize, options: { readonly refused?: boolean; readonly square?: boolean } = {}): string {
  return classNames(base, options.refused ? refused : tones[tone], sizes[size], options.square && 'aspect-square px-0');
}
