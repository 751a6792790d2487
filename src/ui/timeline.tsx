import type { ReactNode } from 'react';

export type TimelineTone = 'quiet' | 'fjord' | 'kelp' | 'ember' | 'rust' | 'straw';

/** What happened, in order. */
export const Timeline = ({ label, children }: { label: string; children: ReactNode }) => (
  <ol aria-label={label} className="border-l border-rule">
    {children}
  </ol>
);

interface ItemProps {
  tone?: TimelineTone;
  /** Who, at the left of the first line. */
  by: ReactNode;
  /** When, at its right. */
  when?: ReactNode;
  children?: ReactNode;
}

export const TimelineItem = ({ tone = 'quiet', by, when, children }: ItemProps) => (
  <li className="relative pb-4 pl-5 last:pb-0">
    <span aria-hidden className={`absolute top-1.5 -left-[5px] size-[9px] rounded-full outline-2 outline-surface ${dots[tone]}`} />
    <p className="flex flex-wrap justify-between gap-x-4 text-small text-ink-3">
      <span>{by}</span>
      {when && <span>{when}</span>}
    </p>
    {children && <div className="mt-0.5 break-words">{children}</div>}
  </li>
);

const dots: Record<TimelineTone, string> = {
  quiet: 'bg-edge',
  fjord: 'bg-fjord',
  kelp: 'bg-kelp',
  ember: 'bg-ember',
  rust: 'bg-rust',
  straw: 'bg-straw',
};
