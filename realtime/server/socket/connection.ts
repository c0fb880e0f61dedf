import { randomBytes } from 'node:crypto';
import type { WebSocket } from 'ws';
import { closeCodes, type CloseReason } from '@/realtime/close-codes';
import { limits, maxEditBytes } from '@/realtime/limits';
import { readPresenceFields } from '@/realtime/presence-fields';
import { decodeClientFrame, encodeFrame, FrameError, type ClientFrame, type Hello } from '@/realtime/protocol';
import type { Member } from '../room/member';
import type { Room } from '../room/room';
import type { LetIn } from './let-in';
import { Outgoing } from './outgoing';
import { RateGate } from './rate-gate';
import { takeEdit } from './take-edit';

export interface ConnectionHost {
  letIn(hello: Hello): Promise<LetIn | CloseReason>;
  /** False when this person has too many sockets already. */
  joined(connection: Connection): boolean;
  ended(connection: Connection): void;
  failed(error: unknown): void;
  /** Milliseconds over which clients come back after a restart. */
  restartSpread(): number;
}

/** One sheet socket: silent until its hello is accepted, then a member of its room. */
export class Connection {
  readonly id = randomBytes(9).toString('base64url');
  member: Member | undefined;
  room: Room | undefined;
  /** When its grant was last seen in the database, milliseconds. */
  verifiedAt = Date.now();
  private phase: 'waiting' | 'joining' | 'joined' | 'ended' = 'waiting';
  private readonly held: Uint8Array[] = [];
  private preAuthBytes = 0;
  private readonly outgoing: Outgoing;
  private readonly deadline: NodeJS.Timeout;
  private pings: NodeJS.Timeout | undefined;
  private missed = 0;
  private readonly presenceGate = new RateGate(limits.presencePerSecond);
  private readonly needGate = new RateGate(limits.needPerSecond);

  constructor(readonly roomId: string, private readonly socket: WebSocket, private readonly host: ConnectionHost) {
    this.outgoing = new Outgoing(socket, () => this.close('overloaded'));
    this.deadline = setTimeout(() => this.close('badProtocol'), limits.helloDeadline);
    socket.binaryType = 'nodebuffer';
    socket.on('message', (data: Buffer, binary: boolean) => this.receive(data, binary));
    // `ws` closes with the right code by itself (1009 for a frame that is too big).
    socket.on('error', () => {});
    socket.on('close', () => this.end());
  }

  /** Bytes that arrived before the hello was accepted, of frames finished or not. */
  countBytes(length: number): void {
    if (this.phase !== 'waiting' && this.phase !== 'joining') return;
    this.preAuthBytes += length;
    if (this.preAuthBytes > limits.preAuthBytes) this.close('badProtocol');
  }

  close(reason: CloseReason): void {
    if (this.phase === 'ended') return;
    this.end();
    // A restart spreads those who come back, the more of them the longer.
    this.socket.close(closeCodes[reason].code, reason === 'restarting' ? `restarting ${this.host.restartSpread()}` : reason);
    // A peer that does not answer the closing handshake is let go by force.
    setTimeout(() => this.socket.terminate(), 2_000).unref();
  }

  private receive(data: Buffer, binary: boolean): void {
    if (this.phase === 'ended') return;
    if (!binary) return this.close('badProtocol');
    const bytes = new Uint8Array(data.buffer, data.byteOffset, data.byteLength);
    if (this.phase === 'joining') {
      this.held.push(bytes);
      return;
    }
    try {
      this.take(decodeClientFrame(bytes));
    } catch (error) {
      this.close(error instanceof FrameError ? 'badProtocol' : 'ourFault');
      if (!(error instanceof FrameError)) this.host.failed(error);
    }
  }

  private take(frame: ClientFrame): void {
    if (this.phase === 'waiting') {
      if (frame.kind !== 'hello') return this.close('badProtocol');
      void this.join(frame);
      return;
    }
    const { member, room } = this;
    switch (frame.kind) {
      case 'hello': return this.close('badProtocol');
      case 'ping': return this.outgoing.send(encodeFrame({ kind: 'pong', at: frame.at }));
      case 'pong':
        this.missed = 0;
        return;
      case 'edit':
        if (room && member) takeEdit(room, member, frame);
        else this.outgoing.send(encodeFrame({
          kind: 'nack', clientSeq: frame.clientSeq, reason: 'quarantined', retry: true, words: 'The stored copy of this sheet is damaged.',
        }));
        return;
      case 'need':
        if (!this.needGate.pass()) return this.close('overloaded');
        if (room && member) void room.catchUp(member, frame.fromSeq);
        return;
      case 'presence': {
        const fields = readPresenceFields(frame.text);
        if (!fields) return this.close('badProtocol');
        if (this.presenceGate.pass()) room?.fan.presence.update(this.id, fields);
        return;
      }
    }
  }

  private async join(hello: Hello): Promise<void> {
    this.phase = 'joining';
    try {
      const answer = await this.host.letIn(hello);
      if (this.isEnded()) return;
      if (typeof answer === 'string') return this.close(answer);
      this.enter(answer, hello);
    } catch (error) {
      this.host.failed(error);
      this.close('overloaded');
    }
  }

  private enter(answer: LetIn, hello: Hello): void {
    clearTimeout(this.deadline);
    const { actor, grant, role, instance, clientIds } = answer;
    const member: Member = {
      connection: this.id, actor, grant, role, instance, clientIds,
      send: (frame, droppable) => this.outgoing.send(frame, droppable),
      sendBulk: (frames) => this.outgoing.sendBulk(frames),
      close: (reason) => this.close(reason),
    };
    this.member = member;
    this.room = answer.room;
    this.phase = 'joined';
    this.verifiedAt = Date.now();
    if (!this.host.joined(this)) return this.close('overloaded');
    if (answer.room) answer.room.join(member, hello);
    else this.welcomeToQuarantine(member);
    this.pings = setInterval(() => this.ping(), limits.pingEvery);
    for (const bytes of this.held.splice(0)) this.receive(Buffer.from(bytes), true);
  }

  private welcomeToQuarantine(member: Member): void {
    member.send(encodeFrame({
      kind: 'welcome', role: member.role, grantVersion: member.grant.version, headSeq: 0, committed: 0, connection: this.id,
      saving: 'quarantined', maxEditBytes,
      why: 'The stored copy of this sheet is damaged. An operator has been told; revisions can still be read.',
    }));
  }

  private ping(): void {
    if (this.missed >= limits.pingMisses) {
      this.end();
      this.socket.terminate();
      return;
    }
    this.missed += 1;
    this.outgoing.send(encodeFrame({ kind: 'ping', at: Date.now() }));
  }

  private isEnded(): boolean {
    return this.phase === 'ended';
  }

  private end(): void {
    if (this.phase === 'ended') return;
    this.phase = 'ended';
    clearTimeout(this.deadline);
    clearInterval(this.pings);
    if (this.member) this.room?.leave(this.member);
    this.host.ended(this);
  }
}
