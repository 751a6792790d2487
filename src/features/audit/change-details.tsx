import { useTranslation } from 'react-i18next';
import type { Subject } from '../../../server/contract/ability';
import { useChangeWords } from './use-change-words';

/** The values a change left behind, for those who ask. */
export function ChangeDetails({ subject, changes }: { subject: Subject; changes: string }) {
  const { t } = useTranslation('audit');
  const lines = useChangeWords(subject)(changes);
  if (lines.length === 0) return <span className="text-ink-3">{t('none')}</span>;
  return (
    <details>
      <summary className="flex min-h-11 w-fit cursor-pointer items-center font-semibold text-fjord underline underline-offset-4 lg:min-h-8">
        {t('details')}
      </summary>
      <dl className="grid gap-1 pb-1">
        {lines.map(({ field, label, text }) => (
          <div key={field} className="flex flex-wrap gap-x-1.5">
            <dt className="text-ink-3">{t('field', { label })}</dt>
            <dd className="wrap-anywhere">{text}</dd>
          </div>
        ))}
      </dl>
    </details>
  );
}
