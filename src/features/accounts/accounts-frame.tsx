import { useTranslation } from 'react-i18next';
import type { Subject } from '../../../server/contract/ability';
import { ListsFrame, type ListOf } from '../../layouts/lists-frame';
import { useAbility, useMembership } from '../../lib/me';
import { paths } from '../../paths';

/** Around the lists of what the producer works with. */
export function AccountsFrame(list: ListOf) {
  const { t } = useTranslation('accounts');
  const { slug } = useMembership().producer;
  const ability = useAbility();
  const lists: { subject: Subject; to: string; name: string }[] = [
    { subject: 'Account', to: paths.accounts(slug), name: t('title') },
    { subject: 'District', to: paths.districts(slug), name: t('districts.title') },
    { subject: 'Product', to: paths.products(slug), name: t('products') },
    { subject: 'Model', to: paths.models(slug), name: t('models') },
  ];
  return <ListsFrame heading={t('all')} label={t('lists')} lists={lists.filter(({ subject }) => ability.can('read', subject))} {...list} />;
}
