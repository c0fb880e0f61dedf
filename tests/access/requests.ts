import type { Operation } from '@/lib/http/operation';
import type { CallOptions } from '../support/api-world';
import type { Cast, Scene, SceneWith } from './scene';

/** How a row's call is made so that whoever may make it succeeds. */
export interface MatrixRequest { readonly holding: SceneWith; readonly options: (scene: Scene, cast: Cast) => CallOptions }

const deck = 'A deck\nV1 in 0 15\nR1 in 0 1k\n*@R1 pmax=0.5\n.end\n';
const bodies: Readonly<Record<string, (scene: Scene, cast: Cast) => unknown>> = {
  signIn: (_, { account }) => account,
  makeBench: () => ({ name: `Bench ${Math.random()}` }),
  postCircuit: () => ({ title: 'Another circuit' }),
  checkDeck: () => ({ deck }),
  patchCircuit: () => ({ title: 'Renamed' }),
  putDeck: () => ({ deck }),
  putHoldPoints: () => [{ name: '12 V', volts: 12, amps: 0.1 }],
  putMakers: (_, { people }) => ({ makers: [people.coMaker.id] }),
  postTicket: () => ({}),
  cutRevision: () => ({ note: 'Again' }),
  askForReview: () => ({}),
  signOff: ({ contentHash }) => ({ holdPoint: '15 V', contentHash }),
  withdrawSignOff: () => ({ reason: 'Wrong part.' }),
  askForChanges: () => ({ reason: 'Gate floats.' }),
  liftObjection: () => ({ reason: 'Seen.' }),
  openThread: () => ({ anchor: { kind: 'spot', x: 10, y: 10 }, body: 'A note' }),
  reply: () => ({ body: 'A reply' }),
  moveThread: () => ({ status: 'resolved' }),
  editMessage: () => ({ body: 'Better words' }),
};
const holding: Readonly<Record<string, SceneWith>> = {
  withdrawSignOff: 'sign-off', liftObjection: 'objection', 'moveThread, must answer': 'must-answer', askForReview: 'cut only',
};

function targetOf(row: string, { target }: Operation, scene: Scene): string {
  switch (target) {
    case 'circuit': return scene.circuit;
    case 'revision': return scene.revision;
    case 'sign-off': return scene.signOff ?? '';
    case 'objection': return scene.objection ?? '';
    case 'thread': return row.includes('must answer') ? scene.mustAnswer ?? '' : scene.thread;
    case 'message': return scene.message;
    default: return '';
  }
}

function paramsOf(row: string, operation: Operation, scene: Scene): Record<string, string> {
  if (operation.target === 'none') return {};
  return operation.target === 'bench' ? { bench: scene.bench } : { id: targetOf(row, operation, scene) };
}

/** The request of a row of the matrix. */
export function requestOf(row: string, operation: Operation): MatrixRequest {
  const body = bodies[operation.id];
  return {
    holding: holding[row] ?? 'nothing',
    options: (scene, cast) => ({
      params: paramsOf(row, operation, scene),
      ...(body ? { body: body(scene, cast) } : {}),
    }),
  };
}
