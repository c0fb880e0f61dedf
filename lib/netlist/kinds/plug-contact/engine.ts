import { contactEngine } from '../engine-resistive';

export const plugContactEngine = contactEngine(() => true);
