import { useTranslation } from 'react-i18next';
import { useFormat } from '../../lib/format';

/** What a run-out speaks of: the side of one bag size, or the whole freezer. */
export function usePlaceName() {
  const { t } = useTranslation('store');
  const { pounds } = useFormat();
  return (bagPounds: number | null): string =>
    bagPounds === null ? t('answers.place.freezer') : t('answers.place.side', { size: pounds(bagPounds) });
}
