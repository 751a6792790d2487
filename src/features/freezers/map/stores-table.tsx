import { memo } from 'react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { MapStore } from '../../../../server/contract/fleet';
import { useFormat } from '../../../lib/format';
import { useMembership } from '../../../lib/me';
import { paths } from '../../../paths';
import { Tag } from '../../../ui/tag';
import { looks } from './drawn-stores';
import type { StoreSaid } from './use-store-said';

interface Props {
  stores: MapStore[];
  said: StoreSaid;
  lit: ReadonlySet<string>;
  onLight: (ids: string[]) => void;
}

/** Close rows on a desk; on a phone each store in a few lines. */
export function StoresTable({ stores, said, lit, onLight }: Props) {
  const { t } = useTranslation('map');
  const columns = [t('store'), t('city'), t('freezers'), t('state'), t('likely')];
  return (
    <div className="rounded-card border border-rule bg-surface sm:overflow-x-auto">
      <table role="table" aria-label={t('title')} className="block w-full text-left text-body sm:table">
        <thead role="rowgroup" className="sr-only sm:not-sr-only sm:table-header-group">
          <tr role="row" className="text-small text-ink-3">
            {columns.map((column) => (
              <th key={column} scope="col" role="columnheader" className="px-2.5 py-2 font-semibold">
                {column}
              </th>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup" className="block divide-y divide-rule sm:table-row-group sm:border-t sm:border-rule">
          {stores.map((store) => (
            <Row key={store.id} store={store} said={said} lit={lit.has(store.id)} onLight={onLight} />
          ))}
        </tbody>
      </table>
    </div>
  );
}

interface RowProps extends Pick<Props, 'said' | 'onLight'> {
  store: MapStore;
  lit: boolean;
}

/** A map that moves shows mostly the same stores. */
const Row = memo(function Row({ store, said, lit, onLight }: RowProps) {
  const { t } = useTranslation('map');
  const { slug } = useMembership().producer;
  const { number } = useFormat();
  const { shape, tone } = looks[store.mark];
  const light = () => onLight([store.id]);
  const dark = () => onLight([]);
  return (
    <tr role="row" onPointerEnter={light} onPointerLeave={dark} onFocus={light} onBlur={dark} className={`${rowClass} ${lit ? 'bg-fjord-tint' : ''}`}>
      <th scope="row" role="rowheader" className="min-w-0 font-semibold wrap-anywhere sm:min-w-32 sm:px-2.5 sm:py-2">
        <Link id={rowIdOf(store)} to={paths.store(slug, store.id)} className="inline-flex min-h-11 items-center hover:underline sm:min-h-7">
          {store.name}
        </Link>
      </th>
      <td role="cell" className="col-start-1 row-start-2 min-w-0 text-ink-2 sm:px-2.5 sm:py-2">
        {store.city}
      </td>
      <td role="cell" className="col-start-1 row-start-3 text-ink-2 sm:px-2.5 sm:py-2">
        <span className="hidden sm:inline">{number(store.freezers)}</span>
        <span className="sm:hidden">{t('freezers-of', { count: store.freezers })}</span>
      </td>
      <td role="cell" className="col-start-2 row-start-1 self-center justify-self-end sm:px-2.5 sm:py-2">
        <Tag tone={tone} shape={shape}>
          {said.mark(store)}
        </Tag>
      </td>
      <td role="cell" className="col-start-2 row-span-2 row-start-2 justify-self-end whitespace-nowrap text-ink-2 sm:whitespace-normal sm:px-2.5 sm:py-2">
        <span aria-hidden className="block text-right text-small text-ink-3 sm:hidden">
          {t('likely')}
        </span>
        <span className="inline-block first-letter:uppercase">{said.likely(store)}</span>
      </td>
    </tr>
  );
});

/** Of the link that names a row. */
export const rowIdOf = ({ id }: MapStore) => `on-map-${id}`;

const rowClass = 'grid grid-cols-[minmax(0,1fr)_auto] gap-x-3 px-4 pb-3 pt-1 sm:table-row';
