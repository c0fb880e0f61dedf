import Link from 'next/link';

/** The mark: a pulse that waits before the gate. */
export function Brand({ href = '/' }: { readonly href?: string }) {
  return (
    <Link href={href} className="flex min-h-6 flex-none items-center gap-[9px] font-cond text-[19px] leading-none font-semibold tracking-[.16em] text-silk max-tablet:min-h-target">
      <svg viewBox="0 0 26 22" aria-hidden="true" className="block h-[22px] w-[26px] fill-none stroke-current">
        <path d="M0 17.5H6V6.5H19" strokeWidth="2.2" />
        <path d="M22.5 1V21" strokeWidth="4" />
      </svg>
      HOLDOFF
    </Link>
  );
}
