'use client';
import { useEffect, useState } from 'react';
import { inSight } from './in-sight';
import type { MarginEntry } from './margin-entry';
import type { Box, MarginAnchor, Obstacles, SheetGeometry, SheetTarget } from './sheet-geometry';

export interface Targets {
  readonly of: ReadonlyMap<string, SheetTarget>;
  readonly texts: readonly Box[];
  readonly obstacles: Obstacles;
  readonly width: number;
  readonly height: number;
}

const none: Targets = { of: new Map(), texts: [], obstacles: { symbols: [], levelWires: [] }, width: 0, height: 0 };

function read(geometry: SheetGeometry, wanted: readonly { readonly key: string; readonly anchor: MarginAnchor | null }[]): Targets {
  const of = new Map<string, SheetTarget>();
  for (const { key, anchor } of wanted) {
    const target = anchor === null ? null : geometry.targetOf(anchor);
    if (target) of.set(key, target);
  }
  const size = geometry.size();
  const { symbols, levelWires } = geometry.obstacles();
  return {
    of, texts: inSight(geometry.texts(), size, 'words'),
    obstacles: { symbols: inSight(symbols, size, 'symbol'), levelWires: inSight(levelWires, size, 'wire') }, ...size,
  };
}

/** Where entries' targets are on the screen, read again after each frame that moved something. */
export function useTargets(geometry: SheetGeometry | null, entries: readonly Pick<MarginEntry, 'key' | 'anchor'>[]): Targets {
  const [targets, setTargets] = useState<Targets>(none);
  useEffect(() => {
    if (!geometry) return;
    let frame = 0;
    const update = () => {
      cancelAnimationFrame(frame);
      frame = requestAnimationFrame(() => setTargets(read(geometry, entries)));
    };
    update();
    const stop = geometry.subscribe(update);
    return () => { cancelAnimationFrame(frame); stop(); };
  }, [geometry, entries]);
  return geometry ? targets : none;
}
