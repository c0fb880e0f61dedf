'use client';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Figures } from '@/components/ui/figures';
import type { Finding } from '@/lib/netlist/findings/finding';
import { editWords } from './finding-words';
import { useMargin } from './margin-context';

/** An edit that a rule offers. Nothing is applied by itself: a maker takes it or leaves it. */
export function ProposedChange({ finding }: { readonly finding: Finding }) {
  const { rights, actions } = useMargin();
  const [declined, setDeclined] = useState(false);
  const { remedy } = finding;
  const { take } = actions;
  if (!remedy?.edits || remedy.edits.length === 0 || !rights.edit || !take || declined) return null;
  return (
    <div className="mt-[7px] mr-2.5 border border-act bg-film">
      <p className="silk border-b border-rule px-[9px] py-1.5 text-act">Proposed change, by the rule</p>
      <ul className="px-[9px] py-[5px] text-sm leading-normal">
        {remedy.edits.map((edit, index) => <li key={index} className="grid grid-cols-[14px_1fr]"><b className="text-act">+</b><span><Figures>{editWords(edit)}</Figures></span></li>)}
      </ul>
      <div className="flex gap-1.5 px-[9px] pb-[9px]">
        <Button size="small" tone="primary" onClick={() => take(finding)}>Take it</Button>
        <Button size="small" onClick={() => setDeclined(true)}>Decline</Button>
      </div>
    </div>
  );
}
