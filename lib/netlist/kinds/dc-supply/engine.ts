import { sourceEngine } from '../engine-source';
import { drawnLevel } from '../engine-source-level';

export const dcSupplyEngine = sourceEngine(['+', '-'], (part, setting) => setting.volts ?? drawnLevel(part), 'value');
