import { Skeleton } from '@/components/ui/skeleton';

/** The table before it is there, in its final layout. */
export function TableSkeleton() {
  return (
    <div aria-busy="true" className="border-[1.5px] border-ink bg-film max-tablet:border-0">
      <p className="sr-only" role="status">Loading the circuits</p>
      <div className="h-[34px] border-b-[1.5px] border-ink max-tablet:hidden" />
      {Array.from({ length: 5 }, (_, index) => (
        <div key={index} className="flex h-[62px] items-center gap-8 border-b border-rule px-2 last:border-0 max-tablet:h-[76px] max-tablet:px-3.5">
          <div className="flex flex-1 flex-col gap-2"><Skeleton className="w-3/4 max-w-[260px]" /><Skeleton className="w-1/2 max-w-[160px]" /></div>
          <Skeleton className="h-[26px]! w-[26px]" />
          <Skeleton className="w-[170px] max-wide:hidden" />
          <Skeleton className="w-14" />
          <Skeleton className="w-[150px] max-tablet:hidden" />
        </div>
      ))}
    </div>
  );
}
