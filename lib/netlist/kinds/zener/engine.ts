import { zenerModel } from '../../models/zener-model';
import { junctionEngine } from '../engine-junction';

export const zenerEngine = junctionEngine((part) => zenerModel(part.facts));
