import { capacitorEngine as openAtDc } from '../engine-resistive';

export const capacitorEngine = openAtDc(['1', '2']);
