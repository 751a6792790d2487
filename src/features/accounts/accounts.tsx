import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { QueryInput, Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import { page, type Place } from '../../api/page';
import { q } from '../../api/query';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { Pager } from '../../table/pager';
import { buttonClass } from '../../ui/button';
import { AccountFilters } from './account-filters';
import { AccountsFrame } from './accounts-frame';
import { AccountsTable } from './accounts-table';
import { NoAccounts } from './no-accounts';

export const accountsPage = page({
  words: ['accounts'],
  queries: (place) => ({ found: q(api.accounts.list, { params: { producer: place.params.producer ?? '' }, query: queryOf(place) }) }),
  View: Accounts,
});

/** Whom the producer sells ice to. */
function Accounts({ found }: { found: Result<typeof api.accounts.list> }) {
  const { t } = useTranslation('accounts');
  const { slug } = useMembership().producer;
  const add = useAbility().can('create', 'Account') && (
    <Link to={paths.newAccount(slug)} className={buttonClass()}>
      {t('new.title')}
    </Link>
  );
  return (
    <AccountsFrame title={t('title')} lead={t('lead')} action={add}>
      <AccountFilters />
      {found.accounts.length === 0 ? <NoAccounts /> : <AccountsTable accounts={found.accounts} />}
      <Pager next={found.next} />
    </AccountsFrame>
  );
}

function queryOf({ search }: Place): QueryInput<typeof api.accounts.list> {
  return {
    q: search.get('q')?.slice(0, 120) || undefined,
    retired: search.get('retired') === 'only' ? 'only' : undefined,
    after: search.get('after') ?? undefined,
    limit: '25',
  };
}
