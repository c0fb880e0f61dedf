import { diodeModel } from '../../models/diode-model';
import { junctionEngine } from '../engine-junction';

export const diodeEngine = junctionEngine((part) => diodeModel(part.facts, 'diode'));
