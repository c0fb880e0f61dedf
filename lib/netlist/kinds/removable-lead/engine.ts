import { contactEngine } from '../engine-resistive';

export const removableLeadEngine = contactEngine(() => true);
