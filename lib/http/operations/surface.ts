import type { Operation } from '../operation';
import * as circuits from './circuits';
import * as people from './people';
import * as review from './review';

/** Every call, in the order of the description. A route that is not here has no handler; a test compares with `app/api`. */
export const surface: readonly Operation[] = [...Object.values(people), ...Object.values(circuits), ...Object.values(review)];
