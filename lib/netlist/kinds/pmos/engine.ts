import { mosfetEngine } from '../engine-mosfet';

export const pmosEngine = mosfetEngine('p');
