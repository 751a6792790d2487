import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import type { TelemetryKey } from '../../../server/contract/sensors';
import { useAct } from '../../api/act';
import { ProblemNote } from '../../form/problem-note';
import { useMembership } from '../../lib/me';
import { Button, ButtonRow } from '../../ui/button';
import { Dialog } from '../../ui/dialog';

interface Props {
  ending: TelemetryKey | null;
  onClose: () => void;
  onEnded: (key: TelemetryKey) => void;
}

/** Ends a key at once, after saying what that does. */
export function EndKey({ ending, onClose, onEnded }: Props) {
  const { t } = useTranslation('sensors');
  const { slug } = useMembership().producer;
  const revoke = useAct(api.sensors.revokeKey, [api.sensors.listKeys]);
  const close = () => {
    revoke.reset();
    onClose();
  };
  const end = (key: TelemetryKey) =>
    revoke.mutate({ params: { producer: slug, keyId: key.id } }, { onSuccess: () => onEnded(key) });
  return (
    <Dialog open={ending !== null} title={t('keys.end.title', { name: ending?.name })} onClose={close}>
      <p>{t('keys.end.words')}</p>
      {revoke.error && <ProblemNote problem={revoke.error} />}
      <div className="mt-4">
        <ButtonRow>
          <Button variant="danger" busy={revoke.isPending} onClick={() => ending && end(ending)}>
            {t('keys.end.yes')}
          </Button>
          <Button variant="quiet" onClick={close}>
            {t('keys.end.no')}
          </Button>
        </ButtonRow>
      </div>
    </Dialog>
  );
}
