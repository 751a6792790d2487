import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { api } from '../../../../server/contract/index';
import type { StoreSettings } from '../../../../server/contract/store-settings';
import { useAct } from '../../../api/act';
import { RetireSection } from '../../../form/retire-section';
import { useMembership } from '../../../lib/me';
import { paths } from '../../../paths';
import { showsStores } from './shows-stores';

export function RetireStore({ settings }: { settings: StoreSettings }) {
  const { t } = useTranslation('store-form');
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const change = useAct(api.stores.change, showsStores);
  const act = settings.retired ? 'restore' : 'retire';
  return (
    <RetireSection
      thing={settings}
      about={t(`${act}.about`)}
      button={t(`${act}.button`)}
      words={{ retire: t('retire.words'), restore: t('restore.words') }}
      send={(storeId, body) => change.mutateAsync({ params: { producer: slug, storeId }, body })}
      source={api.stores.readSettings}
      onDone={(_, retired) => void navigate(retired ? paths.stores(slug) : paths.store(slug, settings.id))}
    />
  );
}
