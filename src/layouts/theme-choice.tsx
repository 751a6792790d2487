import { useId, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { readTheme, setTheme, themes, type Theme } from '../lib/theme';

interface Props {
  /** Where a heading above says already what is chosen. */
  quietLabel?: boolean;
}

/** Light, dark, or as the device has it; kept on this device. */
export function ThemeChoice({ quietLabel }: Props) {
  const { t } = useTranslation();
  const name = useId();
  const [chosen, setChosen] = useState(readTheme);
  const choose = (theme: Theme) => {
    setTheme(theme);
    setChosen(theme);
  };
  return (
    <fieldset>
      <legend className={quietLabel ? 'sr-only' : 'mb-1 text-small text-ink-3'}>{t('theme.label')}</legend>
      <div className="grid grid-cols-[1.4fr_1fr_1fr] overflow-hidden rounded-control border border-edge text-small font-semibold">
        {themes.map((theme) => (
          <label
            key={theme}
            className="grid min-h-11 cursor-pointer place-items-center px-1.5 text-center text-ink-2 has-checked:bg-ink has-checked:text-paper has-focus-visible:outline-2 has-focus-visible:-outline-offset-2 has-focus-visible:outline-fjord"
          >
            <input type="radio" name={name} className="sr-only" checked={chosen === theme} onChange={() => choose(theme)} />
            {t(`theme.${theme}`)}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
