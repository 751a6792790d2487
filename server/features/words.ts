import { createInstance, type TFunction } from 'i18next';
import en from '../../locales/en/csv.json';
import es from '../../locales/es/csv.json';
import type { Language } from '../contract/words';

const words = createInstance();
void words.init({
  resources: { en: { csv: en }, es: { csv: es } },
  defaultNS: 'csv',
  fallbackLng: false,
  initAsync: false,
  interpolation: { escapeValue: false },
});

/** The words of files in their reader's language. */
export const fileWords = (language: Language): TFunction => words.getFixedT(language);
