import { describe, expect, it } from 'vitest';
import { netOfLines } from '@/components/drawing/hot-wires';
import { gateStage } from '@/lib/document/testing/gate-stage';
import { moveItems, shiftBy } from '@/lib/editor/edits/move-items';
import { spokenItems } from '@/lib/editor/spoken/part-spoken';
import { edgesOf, nodesOf } from './flow-records';
import { longestRuns } from './hot-tags';
import { pinStates } from './pin-states';
import { frameBoxOf } from './sheet-frame-box';

const stage = gateStage();
const spoken = spokenItems(stage);

describe('nodes and edges of a sheet', () => {
  it('are the same objects for records that did not change', () => {
    const moved = moveItems(stage, new Set(['R3']), shiftBy(0, 20), () => 'new');
    const [before, after] = [nodesOf(stage, spoken), nodesOf(moved, spoken)];
    const changed = after.filter((node) => !before.includes(node)).map((node) => node.id);
    expect(changed).toEqual(['R3']);
  });

  it('carry ends for their wires and the words they are called by', () => {
    const nodes = nodesOf(stage, spoken);
    const nodeOf = new Map(nodes.map((node) => [node.id, node]));
    for (const edge of edgesOf(stage, spoken, netOfLines(stage), () => false)) {
      expect(nodeOf.get(edge.source)?.handles?.some((handle) => handle.id === edge.sourceHandle)).toBe(true);
      expect(nodeOf.get(edge.target)?.handles?.some((handle) => handle.id === edge.targetHandle)).toBe(true);
    }
    expect(nodeOf.get('R1')?.ariaLabel).toContain('from GATE to 0 V');
  });

  it('mark hazardous nets, each with one tag on its longest run', () => {
    const nets = netOfLines(stage);
    const rail = nets.get('V1:+ top');
    const edges = edgesOf(stage, spoken, nets, (net) => net === rail);
    expect(edges.filter((edge) => edge.data?.hot).map((edge) => edge.id).sort()).toEqual(['V1:+ top', 'top D2:K', 'top L1:1']);
    expect([...longestRuns(stage, edges)]).toEqual([[rail, { a: { x: 0, y: 40 }, b: { x: 300, y: 40 }, length: 300 }]]);
  });
});

it('knows joined, lone and open pins', () => {
  const apart = { ...stage, wires: stage.wires.filter((wire) => wire.id !== 'G1:+ R3:1'), parts: stage.parts.map((part) => (part.id === 'R3' ? { ...part, leftOpen: ['1'] } : part)) };
  expect(pinStates(apart).get('R3')).toBe('open joined');
  expect(pinStates(apart).get('G1')).toBe('lone joined');
  expect(pinStates(stage).get('N1')).toBe('met');
  expect(pinStates(stage).get('Z1')).toBe('joined');
});

it('frames a sheet by its plain size, grown by whole squares', () => {
  expect(frameBoxOf(null)).toEqual({ left: 0, top: 0, right: 860, bottom: 610 });
  expect(frameBoxOf({ left: -90, top: 10, right: 500, bottom: 700 })).toEqual({ left: -150, top: -50, right: 710, bottom: 750 });
});
