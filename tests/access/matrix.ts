/** Everyone who may call: nobody known, a steward of another bench, a guest with the circuit's link, and the bench's people. */
export const callers = [
  'nobody', 'stranger', 'guest', 'member', 'reviewer', 'maker', 'coMaker', 'mentor', 'pastMaker', 'steward',
] as const;
export type CallerName = (typeof callers)[number];

/** `+` may; `1` not signed in (401); `4` not there for them (404); `3` they see it and may not (403). */
type Verdict = '+' | '1' | '4' | '3';

/**
 * Who may make which call. Columns as `callers`: `pastMaker` is a mentor who was a co-maker once, `reviewer` a member named
 * for the revision, `author` calls are made on what the mentor wrote. A call of the surface that is missing here fails the test.
 */
const rows: Readonly<Record<string, string>> = {
  //                    nobody stranger guest member reviewer maker coMaker mentor pastMaker steward
  getHealth:            '+      +        +     +      +        +     +       +      +         +',
  getOpenApi:           '+      +        +     +      +        +     +       +      +         +',
  signIn:               '+      +        +     +      +        +     +       +      +         +',
  signOut:              '1      +        1     +      +        +     +       +      +         +',
  whoAmI:               '1      +        1     +      +        +     +       +      +         +',
  listSessions:         '1      +        1     +      +        +     +       +      +         +',
  endSessions:          '1      +        1     +      +        +     +       +      +         +',
  listBenches:          '1      +        1     +      +        +     +       +      +         +',
  makeBench:            '1      +        1     +      +        +     +       +      +         +',
  listMembers:          '1      4        1     +      +        +     +       +      +         +',
  readAudit:            '1      4        1     +      +        +     +       +      +         +',
  listCircuits:         '1      4        1     +      +        +     +       +      +         +',
  postCircuit:          '1      4        1     +      +        +     +       +      +         +',
  checkDeck:            '1      +        1     +      +        +     +       +      +         +',
  getCircuit:           '1      4        +     +      +        +     +       +      +         +',
  patchCircuit:         '1      4        3     3      3        +     +       3      3         3',
  archiveCircuit:       '1      4        3     3      3        +     3       3      3         +',
  getNetlist:           '1      4        +     +      +        +     +       +      +         +',
  getDeck:              '1      4        +     +      +        +     +       +      +         +',
  putDeck:              '1      4        3     3      3        +     +       3      3         3',
  getFindings:          '1      4        3     +      +        +     +       +      +         +',
  putHoldPoints:        '1      4        3     3      3        +     +       3      3         3',
  putMakers:            '1      4        3     3      3        +     3       3      3         +',
  postTicket:           '1      4        +     +      +        +     +       +      +         +',
  cutRevision:          '1      4        3     3      3        +     +       3      3         3',
  listRevisions:        '1      4        +     +      +        +     +       +      +         +',
  getRevision:          '1      4        +     +      +        +     +       +      +         +',
  getRevisionFindings:  '1      4        +     +      +        +     +       +      +         +',
  getRevisionNetlist:   '1      4        +     +      +        +     +       +      +         +',
  getRevisionSheet:     '1      4        +     +      +        +     +       +      +         +',
  askForReview:         '1      4        3     3      3        +     +       3      3         3',
  signOff:              '1      4        3     3      3        3     3       +      3         3',
  withdrawSignOff:      '1      4        3     3      3        3     3       +      3         +',
  askForChanges:        '1      4        3     3      +        3     3       +      +         3',
  liftObjection:        '1      4        3     3      3        3     3       +      3         +',
  listThreads:          '1      4        3     +      +        +     +       +      +         +',
  openThread:           '1      4        3     +      +        +     +       +      +         +',
  reply:                '1      4        3     +      +        +     +       +      +         +',
  // Resolving a note of the mentor's; one that must be answered is the next row's.
  moveThread:           '1      4        3     3      3        +     +       +      +         +',
  'moveThread, must answer': '1  4        3     3      3        3     3       +      3         3',
  editMessage:          '1      4        3     3      3        3     3       +      3         3',
};

export const verdicts: ReadonlyMap<string, Readonly<Record<CallerName, Verdict>>> = new Map(Object.entries(rows).map(([name, line]) => {
  const cells = line.trim().split(/\s+/) as Verdict[];
  if (cells.length !== callers.length) throw new Error(`The row of ${name} has ${cells.length} cells.`);
  return [name, Object.fromEntries(callers.map((caller, index) => [caller, cells[index]])) as Record<CallerName, Verdict>];
}));
