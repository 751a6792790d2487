import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { readTheme, setTheme, themes, type Theme } from '../lib/theme';
import { SegmentedControl } from '../ui/segmented-control';

/** Light, dark, or as the device has it; kept on this device. */
export function ThemeChoice() {
  const { t } = useTranslation();
  const [chosen, setChosen] = useState(readTheme);
  const choose = (theme: Theme) => {
    setTheme(theme);
    setChosen(theme);
  };
  const segments = themes.map((value) => ({ value, short: t(`theme.${value}-short`), label: t(`theme.${value}`) }));
  return <SegmentedControl label={t('theme.label')} segments={segments} value={chosen} onChange={choose} />;
}
