import { scopedRoles } from '../../../server/contract/people';
import type { Role } from '../../../server/contract/words';

/** Whether a role sees only what is assigned to it. */
export const isScoped = (role: Role | undefined): boolean => scopedRoles.some((scoped) => scoped === role);
