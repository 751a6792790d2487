import { Trans, useTranslation } from 'react-i18next';
import type { FullAnswer as Told, FullSaid } from '../../../server/domain/answers';
import { AnswerBox, type Tone } from './answer-box';
import type { Telling } from './answers';
import { usePlaceName } from './place-name';
import { useStoreWords } from './use-store-words';

const tones: Record<FullSaid['key'], Tone> = {
  'no-freezers': 'fine',
  'no-sensor': 'fine',
  waiting: 'unsure',
  learning: 'fine',
  silent: 'unsure',
  empty: 'bad',
  'perhaps-empty': 'low',
  'runs-out-first': 'low',
  'may-run-out-first': 'low',
  'runs-out': 'low',
  'truck-first': 'fine',
  keeps: 'fine',
};

export function FullAnswer({ answer, zone, now, several }: Telling & { answer: Told }) {
  const { t } = useTranslation('store');
  const say = useStoreWords(zone, now);
  const { value, said, known, all } = answer;
  return (
    <AnswerBox
      question={t('answers.full.question')}
      value={value ? say.percent(value.share) : t('answers.full.none')}
      aside={value && say.pounds(value.pounds)}
      tone={tones[said.key]}
    >
      <p>
        {several && 'place' in said && <span className="font-semibold">{t('answers.about', { freezer: said.place.freezer })} </span>}
        <Sentence said={said} zone={zone} now={now} />
      </p>
      {value && known < all && <p>{t('answers.full.some', { count: known, all })}</p>}
      {value && value.freshness !== 'fresh' && <p className="font-semibold text-straw">{t('answers.full.old', { ago: say.ago(value.at) })}</p>}
    </AnswerBox>
  );
}

function Sentence({ said, zone, now }: { said: FullSaid; zone: string; now: number }) {
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

function timesOf(said: Placed, say: ReturnType<typeof useStoreWords>) {
  if (said.key === 'empty') return {};
  const { early, likely } = said.runOut;
  return {
    when: say.partOfDay(likely),
    early: say.partOfDay(early ?? likely),
    truck: said.truck ? say.dayName(said.truck.from) : '',
  };
}

/** What happens next, where the sentence before has not said it. */
function TruckAfter({ said, zone, now }: { said: Placed; zone: string; now: number }) {
  const { t } = useTranslation('store');
  const say = useStoreWords(zone, now);
  if (said.key === 'truck-first' || said.key === 'runs-out-first') return null;
  if (!said.truck) return t('answers.truck.none');
  return said.truck.to < now ? t('answers.truck.late') : t('answers.truck.comes', { when: say.dayName(said.truck.from) });
}
