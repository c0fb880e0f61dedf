import { ledModel } from '../../models/led-model';
import { junctionEngine } from '../engine-junction';

export const ledEngine = junctionEngine((part) => ledModel(part.facts));
