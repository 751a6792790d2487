import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import type { FreezerSettings } from '../../../../server/contract/freezer-settings';
import { api } from '../../../../server/contract/index';
import { useAct } from '../../../api/act';
import { RetireSection } from '../../../form/retire-section';
import { useMembership } from '../../../lib/me';
import { paths } from '../../../paths';
import { showsFreezers } from '../shows-freezers';

export function RetireFreezer({ settings }: { settings: FreezerSettings }) {
  const { t } = useTranslation('freezer-form');
  const navigate = useNavigate();
  const { slug } = useMembership().producer;
  const change = useAct(api.freezers.change, showsFreezers);
  const act = settings.retired ? 'restore' : 'retire';
  return (
    <RetireSection
      thing={settings}
      about={t(`${act}.about`)}
      button={t(`${act}.button`)}
      words={{ retire: t('retire.words'), restore: t('restore.words') }}
      send={(freezerId, body) => change.mutateAsync({ params: { producer: slug, freezerId }, body })}
      source={api.freezers.readSettings}
      onDone={(_, retired) => void navigate(retired ? paths.store(slug, settings.storeId) : paths.freezer(slug, settings.id))}
    />
  );
}
