import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import type { TelemetryKey } from '../../../server/contract/sensors';
import { page } from '../../api/page';
import { q } from '../../api/query';
import { useFormat } from '../../lib/format';
import { useMembership } from '../../lib/me';
import { CardTable } from '../../table/card-table';
import { Button } from '../../ui/button';
import { EmptyState } from '../../ui/states';
import { useNow } from '../stores/use-now';
import { EndKey } from './end-key';
import { KeyActs, type KeyAct } from './key-acts';
import { KeyState } from './key-state';
import { Moment } from './moment';
import { NewKey } from './new-key';
import { SensorsFrame } from './sensors-frame';

export const keysPage = page({
  words: ['sensors', 'validation'],
  queries: ({ params }) => ({ listed: q(api.sensors.listKeys, { params: { producer: params.producer ?? '' } }) }),
  View: Keys,
});

/** The keys that open the door for readings: make one, replace one, end one. */
function Keys({ listed: { keys } }: { listed: Result<typeof api.sensors.listKeys> }) {
  const { t } = useTranslation('sensors');
  // Kept here and not in a row: the list changes while the new key is still being looked at.
  const [act, setAct] = useState<KeyAct | null>(null);
  const [ended, setEnded] = useState<string | null>(null);
  const close = () => setAct(null);
  const start = (wanted: KeyAct) => {
    setEnded(null);
    setAct(wanted);
  };
  const create = <Button onClick={() => start({ kind: 'create' })}>{t('keys.create')}</Button>;
  return (
    <SensorsFrame title={t('keys.title')} lead={t('keys.lead')}>
      {keys.length === 0 ? (
        <EmptyState title={t('keys.empty')} action={create}>
          {t('keys.empty-words')}
        </EmptyState>
      ) : (
        <>
          <div className="mb-4">{create}</div>
          <KeyTable keys={keys} onAct={start} />
        </>
      )}
      <p role="status" className="mt-3 text-ink-2">
        {ended && t('keys.end.done', { name: ended })}
      </p>
      <NewKey open={act !== null && act.kind !== 'end'} replaced={act?.kind === 'replace' ? act.key : null} onClose={close} />
      {act?.kind === 'end' && (
        <EndKey
          ending={act.key}
          onClose={close}
          onEnded={({ name }) => {
            setEnded(name);
            close();
          }}
        />
      )}
    </SensorsFrame>
  );
}

interface TableProps {
  keys: TelemetryKey[];
  onAct: (act: KeyAct) => void;
}

function KeyTable({ keys, onAct }: TableProps) {
  const { t } = useTranslation('sensors');
  const now = useNow();
  const format = useFormat(useMembership().producer.timeZone);
  const columns = (['name', 'created', 'used', 'state', 'acts'] as const).map((column) => t(`keys.columns.${column}`));
  const rows = keys.map((key) => ({
    id: key.id,
    cells: [
      key.name,
      format.longDate(key.createdAt),
      <Moment key="used" at={key.lastUsedAt} now={now} />,
      <KeyState key="state" endsAt={key.endsAt} now={now} />,
      <KeyActs key="acts" of={key} now={now} onAct={onAct} />,
    ],
  }));
  return <CardTable label={t('keys.title')} columns={columns} rows={rows} />;
}
