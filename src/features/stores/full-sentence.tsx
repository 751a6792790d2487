import { Trans, useTranslation } from 'react-i18next';
import type { FullSaid } from '../../../server/domain/answers';
import { usePlaceName } from './place-name';
import { useStoreWords, type StoreWords } from './use-store-words';

interface Props {
  said: FullSaid;
  zone: string;
  now: number;
}

/** How much there is and what comes next, in a sentence or two. */
export function FullSentence({ said, zone, now }: Props) {
  const { t } = useTranslation('store');
  const say = useStoreWords(zone, now);
  const place = usePlaceName();
  const key = `answers.full.said.${said.key}` as const;
  switch (said.key) {
    case 'no-sensor':
      return said.lastDelivery === null ? t(key, { context: 'never' }) : t(key, { when: say.dayName(said.lastDelivery) });
    case 'silent':
      return t(key, { when: say.when(said.since) });
    case 'keeps':
      return said.past === null ? t(key, { context: 'beyond' }) : t(key, { day: say.weekday(said.past) });
    case 'no-freezers':
    case 'waiting':
    case 'learning':
      return t(key);
    case 'empty':
    case 'perhaps-empty':
    case 'runs-out-first':
    case 'may-run-out-first':
    case 'runs-out':
    case 'truck-first':
      return (
        <>
          <Trans t={t} i18nKey={key} components={{ b: <b /> }} values={{ place: place(said.place.bagPounds), ...timesOf(said, say) }} /> <TruckAfter said={said} zone={zone} now={now} />
        </>
      );
  }
}

type Placed = Extract<FullSaid, { place: object }>;

function timesOf(said: Placed, say: StoreWords) {
  if (said.key === 'empty') return {};
  const { early, likely } = said.runOut;
  return {
    when: say.partOfDay(likely),
    early: say.partOfDay(early ?? likely),
    truck: said.truck ? say.dayName(said.truck.from) : '',
  };
}

/** What happens next, where the sentence before has not said it. */
function TruckAfter({ said, zone, now }: Props & { said: Placed }) {
  const { t } = useTranslation('store');
  const say = useStoreWords(zone, now);
  if (said.key === 'truck-first' || said.key === 'runs-out-first') return null;
  if (said.truck === undefined) return null;
  if (said.truck === null) return t('answers.truck.none');
  return said.truck.to < now ? t('answers.truck.late') : t('answers.truck.comes', { when: say.dayName(said.truck.from) });
}
