import type { ReactNode } from 'react';

/** How an answer looks; its words say the same. */
export type Tone = 'fine' | 'low' | 'bad' | 'unsure';

export const toneText: Record<Tone, string> = { fine: 'text-ink', low: 'text-ember', bad: 'text-rust', unsure: 'text-straw' };

interface Props {
  question: string;
  value: string;
  aside?: string | null;
  tone: Tone;
  children: ReactNode;
}

/** One answer: a big value, and a sentence that says what it means and what happens next. */
export const AnswerBox = ({ question, value, aside, tone, children }: Props) => (
  <div className="min-w-0 px-5 py-4 lg:px-6 lg:py-5">
    <h2 className="text-base font-semibold text-ink-3">{question}</h2>
    <p className={`mt-1 flex flex-wrap items-baseline gap-x-2 ${toneText[tone]}`}>
      <span className="text-display leading-tight font-bold">{value}</span>
      {aside && <span className="text-lead font-semibold">{aside}</span>}
    </p>
    <div className="mt-1 text-base text-ink-2 [&_b]:font-bold [&_b]:text-ink">{children}</div>
  </div>
);
