import { TriangleAlert } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { useMembership } from '../../lib/me';
import type { ProblemKind } from './report-steps';

/** Where somebody could be hurt, or sold bad ice. */
const dangerous = ['not-cooling', 'leak', 'light', 'ice-quality'] as const satisfies ProblemKind[];

/** What to mind before the act, and whom to call when it cannot wait. */
export function Caution({ kind }: { kind: ProblemKind }) {
  const { t } = useTranslation('report');
  const { urgentPhone } = useMembership().producer;
  const danger = dangerous.find((one) => one === kind);
  if (!danger) return null;
  return (
    <aside aria-label={t('cautions.title')} className="mt-4 flex gap-3 rounded-card border border-straw bg-straw-tint px-4 py-3 text-ink">
      <TriangleAlert aria-hidden size={22} className="mt-0.5 shrink-0 text-straw" />
      <div>
        <p className="font-semibold text-straw">{t('cautions.title')}</p>
        <p>{t(`cautions.${danger}`)}</p>
        {urgentPhone && (
          <a href={`tel:${urgentPhone.replace(/[^+\d]/g, '')}`} className="inline-flex min-h-12 items-center font-semibold text-fjord underline underline-offset-4">
            {t('urgent', { phone: urgentPhone })}
          </a>
        )}
      </div>
    </aside>
  );
}
