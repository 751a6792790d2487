import { useTranslation } from 'react-i18next';
import { Tag } from '../../ui/tag';

/** Beside the name of something that is out of use. */
export function RetiredTag() {
  const { t } = useTranslation('accounts');
  return <Tag shape="ring">{t('states.retired')}</Tag>;
}
