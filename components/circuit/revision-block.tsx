import type { ReactNode } from 'react';
import { RevisionLetter } from '@/components/ui/revision-letter';

interface RevisionBlockProps {
  readonly letter: string | null;
  readonly title: ReactNode;
  readonly under?: ReactNode;
  readonly struck?: boolean;
}

/** What is on show: a revision in its box, or the draft in a dashed one. */
export function RevisionBlock({ letter, title, under, struck }: RevisionBlockProps) {
  return (
    <div className="groove-r flex w-[236px] flex-none items-center gap-3 px-4 max-wide:w-[190px] max-tablet:hidden">
      <RevisionLetter letter={letter} size="large" struck={struck} />
      <div className="min-w-0">
        <p className="silk text-silk-2 font-medium">{letter === null ? 'Sheet' : 'Revision'}</p>
        <p className="truncate text-body leading-tight font-medium">{title}</p>
        {under ? <p className="truncate text-xs leading-[1.3] text-silk-2">{under}</p> : null}
      </div>
    </div>
  );
}
