import { bipolarEngine } from '../engine-bipolar';

export const pnpEngine = bipolarEngine('pnp');
