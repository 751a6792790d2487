import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { Answers as Told } from '../../../server/domain/answers';
import { ColdSentence } from './cold-sentence';
import { ComingSentence, comingValue } from './coming-sentence';
import { FullSentence } from './full-sentence';
import { coldTones, comingTones, fullTones, toneText, type Tone } from './tones';
import { useStoreWords } from './use-store-words';

export interface Telling {
  zone: string;
  now: number;
  /** More than one freezer: a sentence has to say which. */
  several: boolean;
}

/** The three answers, each one big value and a sentence that says what it means and what happens next. */
export function Answers({ answers, ...telling }: Telling & { answers: Told }) {
  const { t } = useTranslation('store');
  const { full, cold, coming } = answers;
  const say = useStoreWords(telling.zone);
  const arrival = comingValue(coming, say, telling.now);
  return (
    <section aria-label={t('answers.label')} className="mt-5 grid divide-y divide-rule rounded-card border border-rule bg-surface lg:grid-cols-3 lg:divide-x lg:divide-y-0">
      <Answer
        question={t('answers.full.question')}
        value={full.value ? say.percent(full.value.share) : t('answers.full.none')}
        aside={full.value ? say.pounds(full.value.pounds) : null}
        tone={fullTones[full.said.key]}
      >
        <FullSentence answer={full} {...telling} />
      </Answer>
      <Answer
        question={t('answers.cold.question')}
        value={cold.value ? say.degrees(cold.value.airF) : t('answers.cold.none')}
        aside={cold.value ? t(`answers.cold.word.${coldWord(cold.said.key)}`) : null}
        tone={coldTones[cold.said.key]}
      >
        <ColdSentence answer={cold} {...telling} />
      </Answer>
      <Answer question={t('answers.coming.question')} value={arrival ?? t(comingNothing(coming.said.key))} aside={t(comingAside(coming.said.key), { defaultValue: '' })} tone={comingTones[coming.said.key]}>
        <ComingSentence answer={coming} {...telling} />
      </Answer>
    </section>
  );
}

interface AnswerProps {
  question: string;
  value: string;
  aside: string | null;
  tone: Tone;
  children: ReactNode;
}

const Answer = ({ question, value, aside, tone, children }: AnswerProps) => (
  <div className="min-w-0 px-5 py-4 lg:px-6 lg:py-5">
    <h2 className="text-body font-semibold text-ink-3">{question}</h2>
    <p className={`mt-1 flex flex-wrap items-baseline gap-x-2 ${toneText[tone]}`}>
      <span className="text-display leading-tight font-bold whitespace-nowrap">{value}</span>
      {aside && <span className="text-lead font-semibold">{aside}</span>}
    </p>
    <div className="mt-1 text-body text-ink-2 [&_b]:font-bold [&_b]:text-ink">{children}</div>
  </div>
);
