import { useTranslation } from 'react-i18next';
import { Notice } from '../../../ui/notice';

/** What to mind before a hand goes up to the sensor. */
export function LadderCaution() {
  const { t } = useTranslation('freezer-page');
  return (
    <Notice tone="caution" title={t('caution.title')}>
      <ul className="list-disc pl-5">
        <li>{t('caution.ladder')}</li>
        <li>{t('caution.second')}</li>
        <li>{t('caution.power')}</li>
      </ul>
      <p className="mt-1">{t('caution.codes')}</p>
    </Notice>
  );
}
