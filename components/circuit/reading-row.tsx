'use client';
import { ladderPoints } from '@/components/ladder/ladder-point';
import { marginEntries } from '@/components/margin/margin-entry';
import { stopFlags } from '@/components/margin/stop-flags';
import { Moment } from '@/components/ui/moment';
import { shortName } from '@/components/ui/initials';
import type { Finding } from '@/lib/netlist/findings/finding';
import type { Revision } from '@/lib/schemas/revision';
import { LadderRow } from './ladder-row';
import { RevisionBlock } from './revision-block';
import { signedState } from './signed-state';
import type { ReactNode } from 'react';

interface ReadingRowProps {
  readonly revisions: readonly Revision[];
  readonly revision: Revision;
  readonly shown: string | null;
  readonly onShow: (name: string) => void;
  /** What was stored at the cut; undefined while it loads. */
  readonly findings: readonly Finding[] | undefined;
  readonly act: ReactNode;
}

/** The ladder row of a page that is about one revision. */
export function ReadingRow({ revisions, revision, shown, onShow, findings = [], act }: ReadingRowProps) {
  const signed = signedState(revisions, revision.letter, false, new Date());
  return (
    <LadderRow
      block={<RevisionBlock letter={revision.letter} title={<>Cut <Moment at={revision.cutAt} form="medium" /></>} under={`by ${shortName(revision.cutBy.name)}${revision.note ? `: ${revision.note}` : ''}`} struck={revision.state === 'withdrawn'} />}
      points={ladderPoints(revision.holdPoints)}
      shown={shown}
      onShow={onShow}
      signed={signed}
      flags={stopFlags(marginEntries(findings, []), revision.holdPoints)}
      act={act}
    />
  );
}
