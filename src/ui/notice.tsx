import type { ReactNode } from 'react';
import { CircleCheck, Info, TriangleAlert, WifiOff, type LucideIcon } from 'lucide-react';

export type NoticeTone = 'plain' | 'good' | 'caution' | 'bad' | 'offline';

interface Props {
  tone?: NoticeTone;
  title: string;
  /** `alert` breaks in on those who hear the page; `status` waits; none is for what was there from the start. */
  role?: 'status' | 'alert';
  children?: ReactNode;
}

/** Something to know before going on. */
export function Notice({ tone = 'plain', title, role, children }: Props) {
  const { Icon, box, head } = tones[tone];
  return (
    <div role={role} className={`flex gap-3 rounded-control border-l-4 px-4 py-3 ${box}`}>
      <Icon aria-hidden size={20} className={`mt-px shrink-0 ${head}`} />
      <div className="min-w-0">
        <p className={`font-semibold ${head}`}>{title}</p>
        {children && <div className="text-ink">{children}</div>}
      </div>
    </div>
  );
}

const caution = { box: 'border-straw bg-straw-tint', head: 'text-straw' };

const tones: Record<NoticeTone, { Icon: LucideIcon; box: string; head: string }> = {
  plain: { Icon: Info, box: 'border-fjord bg-fjord-tint', head: 'text-fjord' },
  good: { Icon: CircleCheck, box: 'border-kelp bg-sunk', head: 'text-kelp' },
  caution: { Icon: TriangleAlert, ...caution },
  bad: { Icon: TriangleAlert, box: 'border-rust bg-rust-tint', head: 'text-rust' },
  offline: { Icon: WifiOff, ...caution },
};
