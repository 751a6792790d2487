import { useTranslation } from 'react-i18next';
import { languages, type Language } from '../../server/contract/words';
import { setLanguage } from '../lib/i18n';
import { SegmentedControl } from '../ui/segmented-control';

interface Props {
  /** Keeps the choice with the person, where somebody is signed in. */
  onChosen?: (language: Language) => void;
}

/** English or Spanish, each named in its own words. */
export function LanguageSwitch({ onChosen }: Props) {
  const { t, i18n } = useTranslation();
  const choose = (language: Language) => {
    void setLanguage(language);
    onChosen?.(language);
  };
  const segments = languages.map((value) => ({ value, short: t(`language.${value}-short`), label: t(`language.to-${value}`), lang: value }));
  const now = languages.find((language) => language === i18n.language) ?? 'en';
  return <SegmentedControl label={t('language.label')} segments={segments} value={now} onChange={choose} />;
}
