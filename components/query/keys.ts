/** Names of what the cache holds. Room events invalidate by these. */
export const queryKeys = {
  circuits: (bench: string) => ['circuits', bench] as const,
  members: (bench: string) => ['members', bench] as const,
  circuit: (id: string) => ['circuit', id] as const,
  threads: (circuit: string) => ['circuit', circuit, 'threads'] as const,
  /** What the checks say of the committed sheet. */
  sheetFindings: (circuit: string) => ['circuit', circuit, 'findings'] as const,
  revisions: (circuit: string) => ['circuit', circuit, 'revisions'] as const,
  revision: (id: string) => ['revision', id] as const,
  revisionFindings: (id: string) => ['revision', id, 'findings'] as const,
  sessions: () => ['sessions'] as const,
  audit: (bench: string) => ['audit', bench] as const,
};
