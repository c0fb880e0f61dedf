'use client';
import { ladderPoints } from '@/components/ladder/ladder-point';
import { Moment } from '@/components/ui/moment';
import { shortName } from '@/components/ui/initials';
import type { Revision } from '@/lib/schemas/revision';
import { LadderRow } from './ladder-row';
import { RevisionBlock } from './revision-block';
import { signedState } from './signed-state';
import type { LadderFlag } from '@/components/ladder/ladder-state';
import type { ReactNode } from 'react';

interface ReadingRowProps {
  readonly revisions: readonly Revision[];
  readonly revision: Revision;
  readonly shown: string | null;
  readonly onShow: (name: string) => void;
  readonly flags?: readonly LadderFlag[];
  readonly act: ReactNode;
}

/** The ladder row of a page that is about one revision. */
export function ReadingRow({ revisions, revision, shown, onShow, flags = [], act }: ReadingRowProps) {
  const signed = signedState(revisions, revision.letter, false, new Date());
  return (
    <LadderRow
      block={<RevisionBlock letter={revision.letter} title={<>Cut <Moment at={revision.cutAt} form="medium" /></>} under={`by ${shortName(revision.cutBy.name)}${revision.note ? `: ${revision.note}` : ''}`} struck={revision.state === 'withdrawn'} />}
      points={ladderPoints(revision.holdPoints)}
      shown={shown}
      onShow={onShow}
      signed={signed}
      flags={flags}
      act={act}
    />
  );
}
