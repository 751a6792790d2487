import { useTranslation } from 'react-i18next';

/** The page's name in the browser's tab and history. */
export function PageTitle({ title }: { title: string }) {
  const { t } = useTranslation();
  return <title>{t('title', { page: title })}</title>;
}
