import type { Plan } from '../schema';
import type { Problem } from '../problem';

/** A rule across keys. It is asked only where the parts it needs have no problem of their own. */
export interface Rule {
  /** JSON pointers of the parts it reads. */
  readonly needs: readonly string[];
  readonly check: (plan: Plan) => Problem[];
}
