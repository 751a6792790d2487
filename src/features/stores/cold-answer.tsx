import { useTranslation } from 'react-i18next';
import type { ColdAnswer as Told, ColdSaid } from '../../../server/domain/answers';
import { AnswerBox, type Tone } from './answer-box';
import type { Telling } from './answers';
import { ColdSentence } from './cold-sentence';
import { useStoreWords } from './use-store-words';

const tones: Record<ColdSaid['key'], Tone> = {
  'no-freezers': 'fine',
  'no-sensor': 'fine',
  waiting: 'unsure',
  silent: 'unsure',
  warm: 'bad',
  'above-once': 'unsure',
  holding: 'fine',
  'holding-some': 'fine',
};

type Word = 'holding' | 'warm' | 'unsure';
const words: Partial<Record<ColdSaid['key'], Word>> = { warm: 'warm', 'above-once': 'unsure', holding: 'holding', 'holding-some': 'holding' };

export function ColdAnswer({ answer, zone, now }: Telling & { answer: Told }) {
  const { t } = useTranslation('store');
  const say = useStoreWords(zone, now);
  const { value, said } = answer;
  const word = words[said.key];
  return (
    <AnswerBox
      question={t('answers.cold.question')}
      value={value ? say.degrees(value.airF) : t('answers.cold.none')}
      aside={word && t(`answers.cold.word.${word}`)}
      tone={tones[said.key]}
    >
      <p>
        <ColdSentence said={said} zone={zone} now={now} />
      </p>
      {value && <p className={value.freshness === 'fresh' ? undefined : 'font-semibold text-straw'}>{t('answers.cold.heard', { ago: say.ago('heard' in said ? said.heard : value.at) })}</p>}
    </AnswerBox>
  );
}
