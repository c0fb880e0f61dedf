import { classNames } from './class-names';

/** The tag of hazardous voltage on panels and in lines of text. */
export function HatchTag({ className }: { readonly className?: string }) {
  return <span aria-hidden="true" className={classNames('hatch inline-block h-3 w-[34px] flex-none', className)} />;
}
