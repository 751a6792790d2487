import { useTranslation } from 'react-i18next';
import { useMembership } from '../../lib/me';
import { Notice } from '../../ui/notice';
import { phoneLink, phoneText } from './phone-link';
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
    <Notice tone="caution" title={t('cautions.title')}>
      <p>{t(`cautions.${danger}`)}</p>
      {urgentPhone && (
        <a href={phoneLink(urgentPhone)} className="inline-flex min-h-12 items-center font-semibold text-fjord underline underline-offset-4">
          {t('urgent', { phone: phoneText(urgentPhone) })}
        </a>
      )}
    </Notice>
  );
}
