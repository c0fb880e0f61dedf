import { classNames } from './class-names';

/** Where a line of text will stand; sizes come from the caller, so that the layout is the final one. */
export function Skeleton({ className }: { readonly className?: string }) {
  return <span aria-hidden="true" className={classNames('inline-block h-[9px] rounded-[1px] bg-film-2 ring-1 ring-rule ring-inset', className)} />;
}
