import { useTranslation } from 'react-i18next';
import type { FullAnswer as Told, FullSaid } from '../../../server/domain/answers';
import { AnswerBox, type Tone } from './answer-box';
import type { Telling } from './answers';
import { FullSentence } from './full-sentence';
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
        <FullSentence said={said} zone={zone} now={now} />
      </p>
      {value && known < all && <p>{t('answers.full.some', { count: known, all })}</p>}
      {value && value.freshness !== 'fresh' && <p className="font-semibold text-straw">{t('answers.full.old', { ago: say.ago(value.at) })}</p>}
    </AnswerBox>
  );
}
