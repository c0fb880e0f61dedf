import { coilEngine } from '../engine-coil';

export const airCoreCoilEngine = coilEngine;
