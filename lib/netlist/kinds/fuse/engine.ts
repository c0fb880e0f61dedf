import { contactEngine } from '../engine-resistive';

export const fuseEngine = contactEngine(() => true);
