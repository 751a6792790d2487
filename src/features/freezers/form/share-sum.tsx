import { useTranslation } from 'react-i18next';
import { useFormat } from '../../../lib/format';
import { sumOfShares } from './lane-shares';

/** How the shares add up, and what is missing or too much. */
export function ShareSum({ shares }: { shares: number[] }) {
  const { t } = useTranslation('freezer-form');
  const { tenths } = useFormat();
  const sum = sumOfShares(shares);
  const off = Math.abs(sum - 100);
  const state = off < 0.5 ? 'right' : sum < 100 ? 'less' : 'more';
  return (
    <p role="status" className={`font-semibold ${state === 'right' ? 'text-kelp' : 'text-ember'}`}>
      {t(`lanes.sum.${state}`, { sum: tenths(sum), off: tenths(off) })}
    </p>
  );
}
