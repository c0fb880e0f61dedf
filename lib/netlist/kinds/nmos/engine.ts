import { mosfetEngine } from '../engine-mosfet';

export const nmosEngine = mosfetEngine('n');
