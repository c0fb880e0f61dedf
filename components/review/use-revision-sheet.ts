'use client';
import { useQuery } from '@tanstack/react-query';
import { z } from 'zod';
import { callApi } from '@/components/query/api';
import type { NetVolts } from '@/lib/check/net-volts';
import { holdPointRecordSchema, junctionRecordSchema, partRecordSchema, scenarioRecordSchema, wireRecordSchema, type Sheet } from '@/lib/document/records';

/** A stored drawing. Models and subcircuits are kept for the engine and not read here. */
const sheetSchema = z.object({
  title: z.string(),
  parts: z.array(partRecordSchema),
  wires: z.array(wireRecordSchema),
  junctions: z.array(junctionRecordSchema),
  scenarios: z.array(scenarioRecordSchema),
  holdPoints: z.array(holdPointRecordSchema),
  volts: z.record(z.string(), z.record(z.string(), z.number())),
});

/** The drawing of a cut and the volts of its nets by hold point. */
export type RevisionDrawing = Sheet & { readonly volts: NetVolts };

/** The drawing of a cut. It never changes. */
export function useRevisionSheet(revision: string | undefined) {
  return useQuery({
    queryKey: ['revision', revision ?? '', 'sheet'],
    enabled: revision !== undefined,
    staleTime: Infinity,
    queryFn: async ({ signal }): Promise<RevisionDrawing> => ({ ...await callApi(`/api/revisions/${revision}/sheet`, { answer: sheetSchema, signal }), models: [], subcircuits: [] }),
  });
}
