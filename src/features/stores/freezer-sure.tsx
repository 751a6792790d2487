import { useTranslation } from 'react-i18next';
import type { Freezer } from '../../../server/contract/freezers';
import { useFormat } from '../../lib/format';
import { useStoreWords } from './use-store-words';

interface Props {
  freezer: Freezer;
  state: NonNullable<Freezer['state']>;
  zone: string;
  now: number;
}

/** On demand, in words: how far off the numbers may be. */
export function FreezerSure({ freezer, state, zone, now }: Props) {
  const { t } = useTranslation('store');
  const format = useFormat();
  const say = useStoreWords(zone, now);
  const { level } = state;
  const nameOf = (i: number) => format.pounds(freezer.lanes[i]?.bagPounds ?? 0);
  const within = (name: string, pounds: number, sd: number) => t('freezer.sure.pounds', { name, pounds: format.pounds(pounds), sd: format.number(Math.ceil(sd)) });
  return (
    <details className="mt-2 text-base text-ink-2">
      <summary className="flex min-h-12 cursor-pointer items-center font-semibold text-fjord underline underline-offset-4 lg:min-h-8">{t('freezer.sure.open')}</summary>
      <ul className="grid gap-1 pb-1">
        {level.lanes.length > 1 && level.lanes.map(({ pounds, sdPounds }, i) => <li key={nameOf(i)}>{within(nameOf(i), pounds, sdPounds)}</li>)}
        <li>{within(t('freezer.sure.all'), level.pounds, level.sdPounds)}</li>
        {level.lanes.map(({ borrowed }, i) => borrowed && <li key={nameOf(i)}>{t('freezer.sure.borrowed', { name: nameOf(i) })}</li>)}
        <li>{t('freezer.sure.measured', { when: say.when(state.at) })}</li>
      </ul>
    </details>
  );
}
