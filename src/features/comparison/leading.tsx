import { useTranslation } from 'react-i18next';
import type { ComparedStore } from '../../../server/contract/comparison';
import { useFormat } from '../../lib/format';
import { leadersOf, type Leaders } from './measures';

interface Props {
  stores: ComparedStore[];
  /** Whether these are all, and not one page of more. */
  whole: boolean;
}

const told = ['outDays', 'warmHours', 'lateDeliveries'] as const;
const NAMED = 3;

/** Which stores were out longest, warm longest and late most, in words. */
export function Leading({ stores, whole }: Props) {
  const { t } = useTranslation('comparison');
  const format = useFormat();
  const namesOf = (leaders: Leaders['stores']) => {
    const names = leaders.slice(0, leaders.length > NAMED ? NAMED - 1 : NAMED).map(({ name }) => name);
    return format.list(leaders.length > NAMED ? [...names, t('more', { count: leaders.length - names.length })] : names);
  };
  const sentence = (measure: (typeof told)[number]) => {
    const leaders = leadersOf(stores, measure);
    if (!leaders) return t(`none.${measure}`);
    const amount = t(`amounts.${measure}`, { count: leaders.value, number: format.tenths(leaders.value) });
    return t(`most.${measure}`, { count: leaders.stores.length, names: namesOf(leaders.stores), amount });
  };
  return (
    <section aria-label={t('leading')} className="mb-5 max-w-3xl">
      <p className="font-semibold">{t(whole ? 'of-all' : 'of-page', { count: stores.length })}</p>
      <ul className="mt-1 list-disc pl-5">
        {told.map((measure) => (
          <li key={measure}>{sentence(measure)}</li>
        ))}
      </ul>
    </section>
  );
}
