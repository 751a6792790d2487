import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { TelemetryKey } from '../../../server/contract/sensors';
import { useAct } from '../../api/act';
import { Confirm } from '../../form/confirm';
import { useMembership } from '../../lib/me';

interface Props {
  ending: TelemetryKey;
  onClose: () => void;
  onEnded: (key: TelemetryKey) => void;
}

/** Ends a key at once, after saying what that does. */
export function EndKey({ ending, onClose, onEnded }: Props) {
  const { t } = useTranslation('sensors');
  const { slug } = useMembership().producer;
  const revoke = useAct(api.sensors.revokeKey, [api.sensors.listKeys]);
  const end = () => revoke.mutate({ params: { producer: slug, keyId: ending.id } }, { onSuccess: () => onEnded(ending) });
  return (
    <Confirm title={t('keys.end.title', { name: ending.name })} yes={t('keys.end.yes')} no={t('keys.end.no')} act={revoke} onYes={end} onClose={onClose}>
      <p>{t('keys.end.words')}</p>
    </Confirm>
  );
}
