import i18next from 'i18next';
import { initReactI18next } from 'react-i18next';
import { languages, type Language } from '../../server/contract/words';

const loaders = import.meta.glob<{ default: Record<string, unknown> }>(['../../locales/*/*.json', '!../../locales/*/mail.json']);
const remembered = 'nilas.language';

/** The language a person chose here, else the browser's, else English. */
export function firstLanguage(): Language {
  const chosen = localStorage.getItem(remembered) ?? navigator.language.slice(0, 2);
  return languages.find((language) => language === chosen) ?? 'en';
}

export async function setLanguage(language: Language) {
  await startLanguage();
  localStorage.setItem(remembered, language);
  document.documentElement.lang = language;
  await i18next.changeLanguage(language);
}

/** Loads a noun's words with the page that needs them: `locales/<language>/<noun>.json`. */
const backend = {
  type: 'backend' as const,
  read(language: string, noun: string, done: (error: unknown, words: Record<string, unknown> | null) => void) {
    const load = loaders[`../../locales/${language}/${noun}.json`];
    if (!load) return done(new Error(`no words for ${language}/${noun}`), null);
    load().then(
      (module) => done(null, module.default),
      (error: unknown) => done(error, null),
    );
  },
};

let started: Promise<void> | undefined;

/** Once, before the first drawing; whoever comes later waits for the same. */
export const startLanguage = (): Promise<void> => (started ??= start());

/** Fetches the words of these nouns, so that a page is not drawn without them. */
export async function fetchWords(nouns: string[]) {
  await startLanguage();
  await i18next.loadNamespaces(nouns);
}

async function start() {
  const language = firstLanguage();
  document.documentElement.lang = language;
  await i18next
    .use(backend)
    .use(initReactI18next)
    .init({
      lng: language,
      supportedLngs: languages,
      fallbackLng: false,
      ns: ['common', 'problems'],
      defaultNS: 'common',
      interpolation: { escapeValue: false },
      react: { useSuspense: true },
    });
}
