import { diodeModel } from '../../models/diode-model';
import { junctionEngine } from '../engine-junction';

export const schottkyEngine = junctionEngine((part) => diodeModel(part.facts, 'schottky'));
