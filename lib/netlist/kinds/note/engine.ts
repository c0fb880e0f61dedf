import { markEngine } from '../engine-resistive';

export const noteEngine = markEngine;
