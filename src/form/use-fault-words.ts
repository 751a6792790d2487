import { useTranslation } from 'react-i18next';

/** The words for a fault of the contract; one without words of its own asks for another look. */
export function useFaultWords(): (fault: string | undefined) => string {
  const { t, i18n } = useTranslation('validation');
  return (fault) => (fault && i18n.exists(fault, { ns: 'validation' }) ? t(fault) : t('invalid'));
}
