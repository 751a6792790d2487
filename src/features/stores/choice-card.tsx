import { ChevronRight, type LucideIcon } from 'lucide-react';
import { Link } from 'react-router-dom';

interface Props {
  to: string;
  title: string;
  hint?: string;
  Icon: LucideIcon;
}

/** One big choice among few: a tap answers and goes on. */
export const ChoiceCard = ({ to, title, hint, Icon }: Props) => (
  <Link
    to={to}
    className="flex min-h-16 items-center gap-3 rounded-card border border-edge bg-surface px-4 py-3 text-ink hover:border-fjord hover:bg-fjord-tint"
  >
    <Icon aria-hidden size={26} strokeWidth={1.7} className="shrink-0 text-fjord" />
    <span className="min-w-0 grow">
      <span className="block text-lead font-semibold">{title}</span>
      {hint && <span className="block text-small text-ink-2">{hint}</span>}
    </span>
    <ChevronRight aria-hidden size={20} className="shrink-0 text-ink-3" />
  </Link>
);
