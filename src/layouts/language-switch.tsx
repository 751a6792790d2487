import { useTranslation } from 'react-i18next';
import { languages, type Language } from '../../server/contract/words';
import { setLanguage } from '../lib/i18n';

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
  return (
    <div role="group" aria-label={t('language.label')} className="flex overflow-hidden rounded-control border border-edge">
      {languages.map((language) => (
        <button
          key={language}
          type="button"
          lang={language}
          aria-pressed={i18n.language === language}
          aria-label={t(`language.to-${language}`)}
          onClick={() => choose(language)}
          className="min-h-9 min-w-10 px-2 text-[13px] font-semibold text-ink-2 aria-pressed:bg-ink aria-pressed:text-paper"
        >
          {t(`language.${language}-short`)}
        </button>
      ))}
    </div>
  );
}
