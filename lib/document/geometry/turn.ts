import type { PartRecord } from '../records';
import type { Point } from './point';

export type Turn = PartRecord['turn'];
export type Pose = Pick<PartRecord, 'x' | 'y' | 'turn' | 'mirror'>;

/** A vector of the symbol as it stands once mirrored left to right, then turned clockwise. */
export function posed(vector: Point, pose: Pick<Pose, 'turn' | 'mirror'>): Point {
  const x = pose.mirror ? -vector.x : vector.x;
  const y = vector.y;
  switch (pose.turn) {
    case 0: return { x: x + 0, y };
    case 90: return { x: -y + 0, y: x + 0 };
    case 180: return { x: -x + 0, y: -y + 0 };
    case 270: return { x: y, y: -x + 0 };
  }
}

export function placed(vector: Point, pose: Pose): Point {
  const turned = posed(vector, pose);
  return { x: pose.x + turned.x, y: pose.y + turned.y };
}

export function turnedBy(turn: Turn, quarters: number): Turn {
  return ((((turn / 90 + quarters) % 4) + 4) % 4 * 90) as Turn;
}
