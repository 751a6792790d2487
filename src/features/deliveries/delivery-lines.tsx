import { useTranslation } from 'react-i18next';
import type { Delivery } from '../../../server/contract/deliveries';
import { useFormat } from '../../lib/format';
import { useStoreWords } from '../stores/use-store-words';

interface Props {
  delivery: Delivery;
  zone: string;
}

/** One delivery in three short lines: when and how many bags, of which size, and what was taken back from which lot. */
export function DeliveryLines({ delivery, zone }: Props) {
  const { t } = useTranslation('deliveries');
  const { number, pounds } = useFormat();
  const say = useStoreWords(zone, delivery.at);
  const bags = sum(delivery.lines.map((line) => line.bags));
  const back = sum(delivery.lines.map((line) => line.takenBack));
  const lots = [...new Set(delivery.lines.map(({ lot }) => lot).filter(Boolean))];
  return (
    <>
      <p>
        <b className="font-bold">{say.when(delivery.at)}</b> · {t('bags', { count: bags, bags: number(bags) })}
      </p>
      <p className="text-small text-ink-2">
        {bySize(delivery).map(([size, count]) => t('line', { bags: number(count), size: pounds(size) })).join(', ')}
        {back > 0 && ` · ${t('taken-back', { count: back, bags: number(back) })}`}
      </p>
      {lots.length > 0 && <p className="text-small text-ink-3">{t('lots', { count: lots.length, lots: lots.join(', ') })}</p>}
    </>
  );
}

const sum = (counts: number[]): number => counts.reduce((total, count) => total + count, 0);

/** Lines into several freezers of one bag size, added up. */
function bySize({ lines }: Delivery): [number, number][] {
  const totals = new Map<number, number>();
  for (const { bagPounds, bags } of lines) if (bags > 0) totals.set(bagPounds, (totals.get(bagPounds) ?? 0) + bags);
  return [...totals];
}
