import { classNames } from './class-names';

interface RevisionLetterProps {
  /** Null on the sheet, which is a draft and never shown as a revision. */
  readonly letter: string | null;
  readonly size?: 'small' | 'regular' | 'large';
  /** Superseded and earlier ones stand in a dashed box. */
  readonly past?: boolean;
  /** Withdrawn: the outline is struck. */
  readonly struck?: boolean;
}

const sizes = { small: 'size-[22px] text-md', regular: 'size-[26px] text-lg max-tablet:size-8', large: 'size-[46px] text-[31px]' } as const;

/** The boxed letter of a revision, or the dashed box of the draft. */
export function RevisionLetter({ letter, size = 'regular', past = false, struck = false }: RevisionLetterProps) {
  if (letter === null) {
    return <span className={classNames('grid flex-none place-items-center border-[1.5px] border-dashed border-ink bg-film font-cond font-bold text-ink', size === 'large' ? 'h-[46px] w-14 text-body' : 'h-[26px] px-1.5 text-xs')}>draft</span>;
  }
  return (
    <span className={classNames('grid flex-none place-items-center border-[1.3px] border-ink font-cond leading-none font-bold text-ink', sizes[size], past || struck ? 'border-dashed' : 'bg-film', struck && 'struck-box')}>
      {letter}
    </span>
  );
}
