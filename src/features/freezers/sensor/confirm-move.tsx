import { useTranslation } from 'react-i18next';
import { Confirm } from '../../../form/confirm';
import type { FoundSensor } from './sensor-search';

interface Props {
  serial: string;
  /** Where it hangs now. */
  from: NonNullable<FoundSensor['freezer']>;
  onClose: () => void;
  onMove: () => void;
}

/** Did this sensor really come from another freezer? */
export function ConfirmMove({ serial, from, onClose, onMove }: Props) {
  const { t } = useTranslation('freezer-page');
  return (
    <Confirm title={t('confirm-move.title', { serial })} yes={t('confirm-move.yes')} no={t('confirm-move.no')} variant="primary" onYes={onMove} onClose={onClose}>
      <p>{t('confirm-move.words', { freezer: from.name, store: from.store })}</p>
    </Confirm>
  );
}
