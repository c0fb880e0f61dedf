import { capacitorEngine } from '../engine-resistive';

export const polarisedCapacitorEngine = capacitorEngine(['+', '-']);
