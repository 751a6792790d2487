import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Result } from '../../../server/contract/endpoint';
import type { api } from '../../../server/contract/index';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { CardTable } from '../../table/card-table';
import { Pager } from '../../table/pager';
import { EmptyState } from '../../ui/states';

/** Where the account's freezers stand. */
export function AccountStores({ listed: { stores, next } }: { listed: Result<typeof api.stores.list> }) {
  const { t } = useTranslation('accounts');
  const { slug } = useMembership().producer;
  const rows = stores.map(({ id, name, street, city, district }) => ({
    id,
    cells: [
      <Link key="name" to={paths.store(slug, id)} className="inline-flex min-h-11 items-center text-fjord underline underline-offset-4">
        {name}
      </Link>,
      street,
      city,
      district,
    ],
  }));
  return (
    <section aria-labelledby="stores" className="mt-8">
      <h2 id="stores" className="mb-3 text-lead font-bold">
        {t('stores.title')}
      </h2>
      {stores.length === 0 ? (
        <EmptyState title={t('stores.none')}>{t('stores.none-words')}</EmptyState>
      ) : (
        <CardTable label={t('stores.title')} columns={[t('stores.store'), t('stores.street'), t('stores.city'), t('stores.district')]} rows={rows} />
      )}
      <Pager next={next} />
    </section>
  );
}
