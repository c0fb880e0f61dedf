import { bipolarEngine } from '../engine-bipolar';

export const npnEngine = bipolarEngine('npn');
