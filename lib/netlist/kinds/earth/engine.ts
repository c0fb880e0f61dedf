import { markEngine } from '../engine-resistive';

export const earthEngine = markEngine;
