import { useTranslation } from 'react-i18next';
import type { Freezer } from '../../../../server/contract/freezers';
import { api } from '../../../../server/contract/index';
import { useAct } from '../../../api/act';
import { Confirm } from '../../../form/confirm';
import { useMembership } from '../../../lib/me';
import { LadderCaution } from '../sensor/ladder-caution';
import { showsFreezers } from '../shows-freezers';

interface Props {
  serial: string;
  freezer: Freezer;
  onClose: () => void;
}

/** Takes the sensor off, after asking. */
export function TakeOff({ serial, freezer, onClose }: Props) {
  const { t } = useTranslation('freezer-page');
  const { slug } = useMembership().producer;
  const act = useAct(api.freezers.takeSensorOff, showsFreezers);
  const takeOff = () => act.mutate({ params: { producer: slug, freezerId: freezer.id } }, { onSuccess: onClose });
  return (
    <Confirm title={t('take-off.title', { serial })} yes={t('take-off.yes')} no={t('take-off.no')} act={act} onYes={takeOff} onClose={onClose}>
      <LadderCaution />
      <p>{t('take-off.words', { freezer: freezer.name })}</p>
    </Confirm>
  );
}
