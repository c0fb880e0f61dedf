import { markEngine } from '../engine-resistive';

export const zeroVoltEngine = markEngine;
