import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Account } from '../../../server/contract/accounts';
import { useFormat } from '../../lib/format';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { CardTable } from '../../table/card-table';
import { RetiredTag } from './retired-tag';

export function AccountsTable({ accounts }: { accounts: Account[] }) {
  const { t } = useTranslation(['accounts', 'common']);
  const { slug } = useMembership().producer;
  const { number } = useFormat();
  const columns = [t('name'), t('number'), t('terms'), t('stores.title'), t('common:language.label')];
  const rows = accounts.map((account) => ({
    id: account.id,
    cells: [
      <span key="name" className="flex flex-wrap items-center gap-x-3">
        <Link to={paths.account(slug, account.id)} className="inline-flex min-h-11 items-center text-fjord underline underline-offset-4">
          {account.name}
        </Link>
        {account.retired && <RetiredTag />}
      </span>,
      account.number,
      account.terms || t('none-said'),
      number(account.stores),
      t(`common:language.${account.language}`),
    ],
  }));
  return <CardTable label={t('title')} columns={columns} rows={rows} />;
}
