import { netlistFromDeck } from '@/lib/netlist/deck/netlist-from-deck';
import { readDeck } from '@/lib/netlist/deck/read-deck';
import type { Netlist } from '@/lib/netlist/netlist';
import type { RuleCase } from '@/lib/netlist/rules/testing/rule-case';

/** The netlist of deck lines without title and `.end`; throws with the line and reason of a deck that cannot be read. */
export function netlistOfLines(lines: string): Netlist {
  const reading = readDeck(`Case\n${lines.trim()}\n.end\n`);
  if (!reading.ok) throw new Error(reading.errors.map(({ line, reason }) => `line ${line}: ${reason}`).join('; '));
  return netlistFromDeck(reading.document).netlist;
}

export function netlistOfCase({ deck, plan = [], scenarios = [], edit }: RuleCase): Netlist {
  const netlist: Netlist = { ...netlistOfLines(deck), holdPoints: plan, scenarios };
  return edit ? edit(netlist) : netlist;
}
