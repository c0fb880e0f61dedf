import Link from 'next/link';
import type { ComponentProps } from 'react';
import { buttonStyle, type ButtonSize, type ButtonTone } from './button-style';
import { classNames } from './class-names';
import { Icon, type IconName } from './icon';

interface ButtonLinkProps extends ComponentProps<typeof Link> {
  readonly tone?: ButtonTone;
  readonly size?: ButtonSize;
  readonly icon?: IconName;
}

/** A link to another page that looks like a button. */
export function ButtonLink({ tone = 'plain', size = 'regular', icon, className, children, ...rest }: ButtonLinkProps) {
  return (
    <Link {...rest} className={classNames(buttonStyle(tone, size), className)}>
      {icon ? <Icon name={icon} /> : null}
      {children}
    </Link>
  );
}
