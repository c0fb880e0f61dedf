import * as decoding from 'lib0/decoding';
import * as encoding from 'lib0/encoding';

export type RoomRole = 'maker' | 'reader' | 'guest';
export const roomRoles = ['maker', 'reader', 'guest'] as const satisfies readonly RoomRole[];

export const nackReasons = ['role', 'rate', 'size', 'schema', 'gap', 'foreign id', 'quarantined', 'bytes'] as const;
export type NackReason = (typeof nackReasons)[number];

export const roomStates = ['saving', 'not saving', 'draining', 'quarantined'] as const;
export type RoomSaving = (typeof roomStates)[number];

export interface Hello {
  readonly kind: 'hello';
  readonly ticket: string;
  readonly protocol: number;
  readonly schema: number;
  /** The browser copy that numbers its edits; 128-bit random. */
  readonly instance: string;
  /** Yjs client ids whose structs this copy may send: its own and those of edits kept from an earlier page. */
  readonly clientIds: readonly number[];
  readonly stateVector: Uint8Array;
  readonly lastAcked: number;
  /** A first load that was cut off: the whole's hash and how many parts are here. */
  readonly resume: { readonly hash: string; readonly parts: number };
}

export interface Welcome {
  readonly kind: 'welcome';
  readonly role: RoomRole;
  readonly grantVersion: string;
  readonly headSeq: number;
  /** Highest edit of this instance that is committed. */
  readonly committed: number;
  readonly connection: string;
  readonly saving: RoomSaving;
  readonly why: string;
  readonly maxEditBytes: number;
}

/** A slice of one Yjs update that brings the copy to `uptoSeq`. */
export interface Part {
  readonly kind: 'part';
  readonly uptoSeq: number;
  readonly index: number;
  readonly count: number;
  /** SHA-256 of the whole, hex. */
  readonly hash: string;
  readonly bytes: Uint8Array;
}

export interface Edit { readonly kind: 'edit'; readonly clientSeq: number; readonly bytes: Uint8Array }
export interface Ack { readonly kind: 'ack'; readonly clientSeq: number; readonly seq: number }
export interface Nack {
  readonly kind: 'nack';
  readonly clientSeq: number;
  readonly reason: NackReason;
  /** True when the same bytes may be taken later. */
  readonly retry: boolean;
  readonly words: string;
}
export interface Change { readonly kind: 'change'; readonly seq: number; readonly connection: string; readonly bytes: Uint8Array }
export interface Need { readonly kind: 'need'; readonly fromSeq: number }
/** JSON: `PresenceFields` from a client, a list of `PresenceEntry` from the server. */
export interface Presence { readonly kind: 'presence'; readonly text: string }
export interface State {
  readonly kind: 'state';
  readonly saving: RoomSaving;
  readonly why: string;
  /** Highest edit of the receiver that is committed; it sends again from the next one. */
  readonly committed: number;
}
/** Something beside the sheet changed (a note, a revision, findings): pages read it again. `text` is JSON. */
export interface Event { readonly kind: 'event'; readonly topic: string; readonly text: string }
export interface Ping { readonly kind: 'ping'; readonly at: number }
export interface Pong { readonly kind: 'pong'; readonly at: number }

export type ClientFrame = Hello | Edit | Need | Presence | Ping | Pong;
export type ServerFrame = Welcome | Part | Ack | Nack | Change | Presence | State | Event | Ping | Pong;
export type Frame = ClientFrame | ServerFrame;
export type FrameKind = Frame['kind'];

/** First byte of each frame. Numbers are never used again for something else. */
export const frameBytes = {
  hello: 1, welcome: 2, part: 3, edit: 4, ack: 5, nack: 6, change: 7, need: 8, presence: 9, state: 10, ping: 11, pong: 12,
  event: 13,
} as const satisfies Record<FrameKind, number>;

export const clientFrameKinds = ['hello', 'edit', 'need', 'presence', 'ping', 'pong'] as const satisfies readonly ClientFrame['kind'][];

/** Bytes that are not a frame of this protocol. */
export class FrameError extends Error {
  override readonly name = 'FrameError';
}

const uint = decoding.readVarUint;
const text = decoding.readVarString;
const blob = (from: decoding.Decoder) => decoding.readVarUint8Array(from).slice();

function oneOf<T extends string>(from: decoding.Decoder, values: readonly T[]): T {
  const value = values[uint(from)];
  if (value === undefined) throw new FrameError('A word of the frame is unknown.');
  return value;
}

function truth(from: decoding.Decoder): boolean {
  return oneOf(from, ['no', 'yes']) === 'yes';
}

type Writer<F> = (to: encoding.Encoder, frame: F) => void;
type Reader<F> = (from: decoding.Decoder) => Omit<F, 'kind'>;
type Codec<F> = { readonly write: Writer<F>; readonly read: Reader<F> };

const stamp: Codec<{ kind: string; at: number }> = {
  write: (to, { at }) => encoding.writeVarUint(to, at),
  read: (from) => ({ at: uint(from) }),
};

const codecs: { readonly [K in FrameKind]: Codec<Extract<Frame, { kind: K }>> } = {
  hello: {
    write(to, frame) {
      encoding.writeVarString(to, frame.ticket);
      encoding.writeVarUint(to, frame.protocol);
      encoding.writeVarUint(to, frame.schema);
      encoding.writeVarString(to, frame.instance);
      encoding.writeVarUint(to, frame.clientIds.length);
      for (const id of frame.clientIds) encoding.writeVarUint(to, id);
      encoding.writeVarUint8Array(to, frame.stateVector);
      encoding.writeVarUint(to, frame.lastAcked);
      encoding.writeVarString(to, frame.resume.hash);
      encoding.writeVarUint(to, frame.resume.parts);
    },
    read: (from) => ({
      ticket: text(from), protocol: uint(from), schema: uint(from), instance: text(from),
      clientIds: readList(from, uint),
      stateVector: blob(from), lastAcked: uint(from), resume: { hash: text(from), parts: uint(from) },
    }),
  },
  welcome: {
    write(to, frame) {
      encoding.writeVarUint(to, roomRoles.indexOf(frame.role));
      encoding.writeVarString(to, frame.grantVersion);
      encoding.writeVarUint(to, frame.headSeq);
      encoding.writeVarUint(to, frame.committed);
      encoding.writeVarString(to, frame.connection);
      encoding.writeVarUint(to, roomStates.indexOf(frame.saving));
      encoding.writeVarString(to, frame.why);
      encoding.writeVarUint(to, frame.maxEditBytes);
    },
    read: (from) => ({
      role: oneOf(from, roomRoles), grantVersion: text(from), headSeq: uint(from), committed: uint(from),
      connection: text(from), saving: oneOf(from, roomStates), why: text(from), maxEditBytes: uint(from),
    }),
  },
  part: {
    write(to, frame) {
      encoding.writeVarUint(to, frame.uptoSeq);
      encoding.writeVarUint(to, frame.index);
      encoding.writeVarUint(to, frame.count);
      encoding.writeVarString(to, frame.hash);
      encoding.writeVarUint8Array(to, frame.bytes);
    },
    read: (from) => ({ uptoSeq: uint(from), index: uint(from), count: uint(from), hash: text(from), bytes: blob(from) }),
  },
  edit: {
    write(to, frame) {
      encoding.writeVarUint(to, frame.clientSeq);
      encoding.writeVarUint8Array(to, frame.bytes);
    },
    read: (from) => ({ clientSeq: uint(from), bytes: blob(from) }),
  },
  ack: {
    write(to, frame) {
      encoding.writeVarUint(to, frame.clientSeq);
      encoding.writeVarUint(to, frame.seq);
    },
    read: (from) => ({ clientSeq: uint(from), seq: uint(from) }),
  },
  nack: {
    write(to, frame) {
      encoding.writeVarUint(to, frame.clientSeq);
      encoding.writeVarUint(to, nackReasons.indexOf(frame.reason));
      encoding.writeVarUint(to, frame.retry ? 1 : 0);
      encoding.writeVarString(to, frame.words);
    },
    read: (from) => ({ clientSeq: uint(from), reason: oneOf(from, nackReasons), retry: truth(from), words: text(from) }),
  },
  change: {
    write(to, frame) {
      encoding.writeVarUint(to, frame.seq);
      encoding.writeVarString(to, frame.connection);
      encoding.writeVarUint8Array(to, frame.bytes);
    },
    read: (from) => ({ seq: uint(from), connection: text(from), bytes: blob(from) }),
  },
  need: {
    write: (to, { fromSeq }) => encoding.writeVarUint(to, fromSeq),
    read: (from) => ({ fromSeq: uint(from) }),
  },
  presence: {
    write: (to, frame) => encoding.writeVarString(to, frame.text),
    read: (from) => ({ text: text(from) }),
  },
  state: {
    write(to, frame) {
      encoding.writeVarUint(to, roomStates.indexOf(frame.saving));
      encoding.writeVarString(to, frame.why);
      encoding.writeVarUint(to, frame.committed);
    },
    read: (from) => ({ saving: oneOf(from, roomStates), why: text(from), committed: uint(from) }),
  },
  event: {
    write(to, frame) {
      encoding.writeVarString(to, frame.topic);
      encoding.writeVarString(to, frame.text);
    },
    read: (from) => ({ topic: text(from), text: text(from) }),
  },
  ping: stamp,
  pong: stamp,
};

/** Longest list in any frame; more is refused before anything is allocated. */
const longestList = 1_024;

function readList<T>(from: decoding.Decoder, read: (from: decoding.Decoder) => T): T[] {
  const length = uint(from);
  if (length > longestList) throw new FrameError('A list of the frame is too long.');
  return Array.from({ length }, () => read(from));
}

const kindByByte = new Map<number, FrameKind>(
  Object.entries(frameBytes).map(([kind, byte]) => [byte, kind as FrameKind]),
);

/** One frame as bytes. */
export function encodeFrame<K extends FrameKind>(frame: Extract<Frame, { kind: K }>): Uint8Array {
  const kind: K = frame.kind as K;
  return encoding.encode((to) => {
    encoding.writeUint8(to, frameBytes[kind]);
    (codecs[kind] as unknown as Codec<Extract<Frame, { kind: K }>>).write(to, frame);
  });
}

/**
 * Reads a frame of one of `kinds`.
 * @throws FrameError for an unknown or foreign kind, a frame cut short, or bytes left over
 */
function decodeFrame(bytes: Uint8Array, kinds?: readonly FrameKind[]): Frame {
  try {
    const from = decoding.createDecoder(bytes);
    const kind = kindByByte.get(decoding.readUint8(from));
    if (kind === undefined || (kinds !== undefined && !kinds.includes(kind))) throw new FrameError('Unknown kind of frame.');
    const frame = { kind, ...codecs[kind].read(from) } as Frame;
    if (decoding.hasContent(from)) throw new FrameError('Bytes left over after the frame.');
    return frame;
  } catch (error) {
    if (error instanceof FrameError) throw error;
    throw new FrameError('The frame is cut short or not ours.', { cause: error });
  }
}

/** @throws FrameError for anything a client may not send */
export function decodeClientFrame(bytes: Uint8Array): ClientFrame {
  return decodeFrame(bytes, clientFrameKinds) as ClientFrame;
}

/** @throws FrameError for anything that is not a frame */
export function decodeServerFrame(bytes: Uint8Array): ServerFrame {
  return decodeFrame(bytes) as ServerFrame;
}
