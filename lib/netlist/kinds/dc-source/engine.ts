import { sourceEngine } from '../engine-source';
import { drawnLevel } from '../engine-source-level';

export const dcSourceEngine = sourceEngine(['+', '-'], (part, setting) => setting.volts ?? drawnLevel(part), 'value');
