import { useTranslation } from 'react-i18next';
import type { Result } from '../../../server/contract/endpoint';
import type { api } from '../../../server/contract/index';

type Entry = Result<typeof api.audit.list>['entries'][number];

/** Who did it, and as what. */
export function Actor({ actor }: Pick<Entry, 'actor'>) {
  const { t } = useTranslation(['audit', 'common']);
  if (actor === null) return t('operator');
  return (
    <>
      <span className="block wrap-anywhere">{actor.name}</span>
      <span className="block text-small text-ink-3">{t(`common:roles.${actor.role}`)}</span>
    </>
  );
}
