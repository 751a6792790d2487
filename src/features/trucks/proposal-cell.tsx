import { useTranslation } from 'react-i18next';
import type { TruckRow } from '../../../server/contract/trucks';
import { instantOf } from '../../../server/domain/civil';
import { useStoreWords } from '../stores/use-store-words';
import { DraftFields } from './draft-fields';
import type { Draft, Drafts } from './truck-drafts';

interface Props {
  row: TruckRow;
  draft: Draft | undefined;
  now: number;
  onChange: (next: (drafts: Drafts) => Drafts) => void;
}

/** The usual next day, until something is proposed. */
export function ProposalCell({ row, draft, now, onChange }: Props) {
  const { t } = useTranslation('trucks');
  const say = useStoreWords(row.store.timeZone, now);
  if (draft) return <DraftFields draft={draft} now={now} onChange={onChange} />;
  if (!row.usual) return <span className="text-ink-3">{t('no-usual')}</span>;
  const { day, from, to } = row.usual;
  const at = (time: string) => instantOf(day, time, row.store.timeZone);
  return <span className="text-ink-2">{t('usual', { when: say.dayAndWindow({ day, from: at(from), to: at(to) }) })}</span>;
}
