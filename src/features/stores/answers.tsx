import { useTranslation } from 'react-i18next';
import type { Answers as Told } from '../../../server/domain/answers';
import { ColdAnswer } from './cold-answer';
import { ComingAnswer } from './coming-answer';
import { FullAnswer } from './full-answer';

/** What the sentences need beside what they say. */
export interface Telling {
  zone: string;
  now: number;
  /** More than one freezer: a sentence has to say which. */
  several: boolean;
}

/** Is it full, is it cold, when is the truck coming, where that is told. */
export function Answers({ answers, ...telling }: Telling & { answers: Told }) {
  const { t } = useTranslation('store');
  return (
    <section
      aria-label={t('answers.label')}
      className="mt-5 grid divide-y divide-rule rounded-card border border-rule bg-surface lg:auto-cols-fr lg:grid-flow-col lg:divide-x lg:divide-y-0"
    >
      <FullAnswer answer={answers.full} {...telling} />
      <ColdAnswer answer={answers.cold} {...telling} />
      {answers.coming && <ComingAnswer answer={answers.coming} {...telling} />}
    </section>
  );
}
