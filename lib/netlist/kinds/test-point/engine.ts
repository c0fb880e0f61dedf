import { markEngine } from '../engine-resistive';

export const testPointEngine = markEngine;
