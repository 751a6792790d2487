import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Link, useLocation } from 'react-router-dom';
import type { Account } from '../../../server/contract/accounts';
import type { Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import { page } from '../../api/page';
import { q } from '../../api/query';
import { PageTitle } from '../../layouts/page-title';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { linkClass } from '../../ui/link-class';
import { Notice } from '../../ui/notice';
import { AccountActs } from './account-acts';
import { AccountContacts } from './account-contacts';
import { AccountFacts } from './account-facts';
import { accountQuery } from './account-query';
import { AccountStores } from './account-stores';
import { doneOf } from './done';
import { RetireAccount } from './retire-account';
import { RetiredTag } from './retired-tag';

export const accountPage = page({
  words: ['accounts'],
  queries: (place) => ({
    account: accountQuery(place),
    listed: q(api.stores.list, {
      params: { producer: place.params.producer ?? '' },
      query: { account: place.params.accountId, after: place.search.get('after') ?? undefined, limit: '25' },
    }),
  }),
  View: AccountPage,
});

interface Props {
  account: Account;
  listed: Result<typeof api.stores.list>;
}

/** One customer: what was agreed, whom to call, and the stores. */
function AccountPage({ account, listed }: Props) {
  const { t } = useTranslation('accounts');
  const { slug } = useMembership().producer;
  const [asking, setAsking] = useState(false);
  const [done, setDone] = useState<string | null>(null);
  // What a form did before it led here.
  const before = doneOf(useLocation().state);
  const said = done ?? (before && t(`done.${before}`));
  return (
    <div className="px-4 py-5 lg:px-7 lg:py-6">
      <PageTitle title={account.name} />
      <Link to={paths.accounts(slug)} className={linkClass()}>
        {t('back')}
      </Link>
      <div className="flex flex-wrap items-center gap-3">
        <h1 className="text-title font-bold wrap-anywhere">{account.name}</h1>
        {account.retired && <RetiredTag />}
      </div>
      <AccountActs account={account} onRetire={() => setAsking(true)} />
      <div role="status" className="mt-4 empty:hidden">
        {said && <Notice tone="good" title={said} />}
      </div>
      <div className="mt-6 grid gap-8 lg:grid-cols-2">
        <AccountFacts account={account} />
        <AccountContacts contacts={account.contacts} />
      </div>
      <AccountStores listed={listed} />
      {asking && <RetireAccount account={account} onClose={() => setAsking(false)} onDone={setDone} />}
    </div>
  );
}
