import { markEngine } from '../engine-resistive';

export const netNameEngine = markEngine;
