import { useTranslation } from 'react-i18next';
import type { MapStore } from '../../../../server/contract/fleet';
import { useFormat } from '../../../lib/format';
import { StoresTable } from './stores-table';
import type { StoreSaid } from './use-store-said';

interface Props {
  stores: MapStore[];
  said: StoreSaid;
  lit: ReadonlySet<string>;
  onLight: (ids: string[]) => void;
}

const mostRows = 100;

/** What the map shows, in words. */
export function StoresInView({ stores, ...shown }: Props) {
  const { t } = useTranslation('map');
  const { number } = useFormat();
  const more = stores.length - mostRows;
  return (
    <div className="min-w-0">
      <p role="status" className="mb-2 text-small text-ink-2">
        {stores.length === 0 ? t('none-in-view') : t('in-view', { count: stores.length, number: number(stores.length) })}
      </p>
      {stores.length > 0 && <StoresTable stores={stores.slice(0, mostRows)} {...shown} />}
      {more > 0 && <p className="mt-3 font-semibold text-ink-2">{t('more', { count: more, number: number(more) })}</p>}
    </div>
  );
}
