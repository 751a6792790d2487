import { useTranslation } from 'react-i18next';
import type { TelemetryKey } from '../../../server/contract/sensors';
import { Button, ButtonRow } from '../../ui/button';
import { keyEnded } from './key-ended';

export type KeyAct = { kind: 'create' } | { kind: 'replace' | 'end'; key: TelemetryKey };

interface Props {
  of: TelemetryKey;
  now: number;
  onAct: (act: KeyAct) => void;
}

/** What can be done with a key: one that has ended stays ended, one that has a successor needs no other. */
export function KeyActs({ of: key, now, onAct }: Props) {
  const { t } = useTranslation('sensors');
  if (key.endsAt !== null && keyEnded(key.endsAt, now)) return <span className="text-ink-3">{t('keys.no-acts')}</span>;
  return (
    <ButtonRow>
      {key.endsAt === null && (
        <Button variant="quiet" label={t('keys.replace.of', { name: key.name })} onClick={() => onAct({ kind: 'replace', key })}>
          {t('keys.replace.button')}
        </Button>
      )}
      <Button variant="quiet" label={t('keys.end.of', { name: key.name })} onClick={() => onAct({ kind: 'end', key })}>
        {t('keys.end.button')}
      </Button>
    </ButtonRow>
  );
}
