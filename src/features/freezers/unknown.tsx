import { useTranslation } from 'react-i18next';

/** Seen as a dash, heard as a word. */
export function Unknown() {
  const { t } = useTranslation('freezers');
  return (
    <span className="text-ink-3">
      <span aria-hidden>—</span>
      <span className="sr-only">{t('unknown')}</span>
    </span>
  );
}
