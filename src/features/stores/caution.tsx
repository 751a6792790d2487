import { useTranslation } from 'react-i18next';
import type { StorePage } from '../../../server/contract/stores';
import { phoneLink, phoneText } from '../../lib/phone-link';
import { linkClass } from '../../ui/link-class';
import { Notice } from '../../ui/notice';
import type { ProblemKind } from './report-steps';
import { useUrgentPhone } from './use-urgent-phone';

/** Where somebody could be hurt, or sold bad ice. */
const dangerous = ['not-cooling', 'leak', 'light', 'ice-quality'] as const satisfies ProblemKind[];

interface Props {
  kind: ProblemKind;
  store: StorePage['store'];
}

/** What to mind before the act, and whom to call when it cannot wait. */
export function Caution({ kind, store }: Props) {
  const { t } = useTranslation('report');
  const urgentPhone = useUrgentPhone(store);
  const danger = dangerous.find((one) => one === kind);
  if (!danger) return null;
  return (
    <Notice tone="caution" title={t('cautions.title')}>
      <p>{t(`cautions.${danger}`)}</p>
      {urgentPhone && (
        <a href={phoneLink(urgentPhone)} className={linkClass('big')}>
          {t('urgent', { phone: phoneText(urgentPhone) })}
        </a>
      )}
    </Notice>
  );
}
