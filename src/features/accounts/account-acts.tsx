import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Account } from '../../../server/contract/accounts';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { Button, buttonClass, ButtonRow } from '../../ui/button';

interface Props {
  account: Account;
  onRetire: () => void;
}

/** What can be done about an account, by those who may. */
export function AccountActs({ account: { id, retired }, onRetire }: Props) {
  const { t } = useTranslation(['accounts', 'common']);
  const { slug } = useMembership().producer;
  const ability = useAbility();
  const change = ability.can('update', 'Account');
  const addStore = !retired && ability.can('create', 'Store');
  const invite = !retired && ability.can('create', 'Person');
  if (!change && !addStore && !invite) return null;
  return (
    <div className="mt-4">
      <ButtonRow>
        {change && (
          <Link to={paths.changeAccount(slug, id)} className={buttonClass()}>
            {t('change.button')}
          </Link>
        )}
        {addStore && (
          <Link to={paths.newStore(slug, id)} className={buttonClass('quiet')}>
            {t('stores.add')}
          </Link>
        )}
        {invite && (
          <Link to={paths.invite(slug)} className={buttonClass('quiet')}>
            {t('invite')}
          </Link>
        )}
        {change && (
          <Button variant="quiet" onClick={onRetire}>
            {retired ? t('common:restore.button') : t('common:retire.button')}
          </Button>
        )}
      </ButtonRow>
    </div>
  );
}
