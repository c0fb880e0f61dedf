import { contactEngine } from '../engine-resistive';

export const switchEngine = contactEngine((part) => part.facts.closed_switch === true);
