import { useTranslation } from 'react-i18next';
import type { MemberOf } from '../../../server/contract/people';
import { isScoped } from './scoped';

const SHOWN = 4;

/** What of the producer's somebody sees: the first few by name, the rest counted. */
export function Assigned({ role, scopes }: MemberOf) {
  const { t } = useTranslation('people');
  if (!isScoped(role)) return t([`assigned.${role}`, 'assigned.everything']);
  if (scopes.length === 0) return t('assigned.nothing');
  const rest = scopes.length - SHOWN;
  return (
    <>
      {scopes.slice(0, SHOWN).map(({ name }) => name).join(', ')}
      {rest > 0 && <span className="block text-small text-ink-3">{t('assigned.more', { count: rest })}</span>}
    </>
  );
}
