import { row, type Action, type Subject } from '../../../server/contract/ability';
import { Problem } from '../../api/call';
import { useAbility } from '../../lib/me';

/** A page for an act the person may not do says so at once, not after the form is filled in. */
export function useMust(action: Action, type: Subject, fields: Record<string, unknown>) {
  if (!useAbility().can(action, row(type, fields))) throw new Problem('not-allowed', 403);
}
