import { coilEngine } from '../engine-coil';

export const inductorEngine = coilEngine;
