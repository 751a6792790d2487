import { useTranslation } from 'react-i18next';
import type { Account } from '../../../server/contract/accounts';
import { api } from '../../../server/contract/index';
import { useAct } from '../../api/act';
import { RetireDialog } from '../../form/retire-dialog';
import { useMembership } from '../../lib/me';
import { accountStale } from './account-query';

interface Props {
  account: Account;
  onClose: () => void;
  onDone: (words: string) => void;
}

export function RetireAccount({ account, ...rest }: Props) {
  const { t } = useTranslation('accounts');
  const { slug } = useMembership().producer;
  const change = useAct(api.accounts.change, accountStale);
  return (
    <RetireDialog
      {...rest}
      thing={account}
      words={{ retire: t('retire.words'), restore: t('restore.words') }}
      needed={account.stores > 0 ? t('retire.needed', { count: account.stores }) : null}
      send={(accountId, body) => change.mutateAsync({ params: { producer: slug, accountId }, body })}
      source={api.accounts.read}
    />
  );
}
