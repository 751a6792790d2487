import { useTranslation } from 'react-i18next';
import { row } from '../../../server/contract/ability';
import type { Freezer } from '../../../server/contract/freezers';
import type { StorePage } from '../../../server/contract/stores';
import { truckToCome } from '../../../server/domain/answers';
import { useAbility } from '../../lib/me';
import { useKnown } from './store-known';
import { useStoreWords } from './use-store-words';

interface Props {
  freezer: Freezer;
  found: StorePage;
  now: number;
}

/** What is known of a freezer nobody can see into: what was last left in it, and what comes next. */
export function FreezerUnseen({ freezer, found, now }: Props) {
  const { t } = useTranslation('store');
  const say = useStoreWords(found.store.timeZone, now);
  const last = found.deliveries.find(({ lines }) => lines.some(({ freezerId }) => freezerId === freezer.id || freezerId === null));
  const bags = last?.lines.reduce((sum, line) => (line.freezerId === freezer.id || line.freezerId === null ? sum + line.bags : sum), 0) ?? 0;
  const readsDeliveries = useAbility().can('read', row('Delivery', { storeId: found.store.id }));
  const truck = truckToCome(useKnown(found));
  return (
    <div className="mt-2 grid gap-1 text-ink-2">
      <p>{t(freezer.sensor ? 'freezer.waiting' : 'freezer.no-sensor')}</p>
      {readsDeliveries && (
        <p>
          {last
            ? t('freezer.last-delivery', { when: say.dayName(last.at), bags: t('freezer.bags', { count: bags, bags: say.number(bags) }) })
            : t('freezer.no-delivery')}
        </p>
      )}
      {truck !== undefined && <p>{truck ? t('freezer.next-truck', { when: say.dayAndWindow(truck) }) : t('freezer.no-truck')}</p>}
    </div>
  );
}
