import { createInstance } from 'i18next';
import en from '../../../locales/en/mail.json';
import es from '../../../locales/es/mail.json';
import type { Language } from '../../contract/words';
import type { Mail } from '../../ports/mail';

export type MailTemplate = Exclude<keyof typeof en, 'kinds' | 'footer' | 'plainLink'>;

/** A mail by its meaning; the words are chosen by the reader's language. */
export interface MailMessage {
  template: MailTemplate;
  to: string;
  language: Language;
  params: Record<string, string | number>;
  /** Path within the portal that the button opens. */
  path: string;
}

const brand = 'Nilas';
const words = createInstance();
void words.init({
  resources: { en: { mail: en }, es: { mail: es } },
  defaultNS: 'mail',
  fallbackLng: false,
  initAsync: false,
  interpolation: { escapeValue: false },
});

export function composeMail({ template, to, language, params, path }: MailMessage, baseUrl: string): Mail {
  const t = words.getFixedT(language);
  const given = { ...params, brand };
  // The rule on locales sees to it that `lines` is a list of texts in every language.
  const lines = (t(`${template}.lines`, { ...given, returnObjects: true }) as string[]).filter((line) => line.trim() !== '');
  const link = new URL(path, baseUrl).href;
  const subject = t(`${template}.subject`, given).replace(/[\r\n]+/g, ' ');
  const button = t(`${template}.button`);
  const footer = t('footer', { brand });
  return {
    to,
    subject,
    text: [...lines, `${button}: ${link}`, '--', footer].join('\n\n'),
    html: page(language, subject, [
      ...lines.map((line) => `<p>${escape(line).replace(/\n/g, '<br>')}</p>`),
      `<p><a href="${escape(link)}" style="${BUTTON}">${escape(button)}</a></p>`,
      `<p style="${SMALL}">${escape(t('plainLink'))}<br>${escape(link)}</p>`,
      `<p style="${SMALL}">${escape(footer)}</p>`,
    ]),
  };
}

/** What a request is about, inside a sentence. */
export const kindInWords = (language: Language, kind: keyof (typeof en)['kinds']): string => words.getFixedT(language)(`kinds.${kind}`);

export const dayInWords = (language: Language, day: string): string =>
  new Intl.DateTimeFormat(language === 'es' ? 'es-US' : 'en-US', { weekday: 'long', day: 'numeric', month: 'long', timeZone: 'UTC' }).format(
    new Date(`${day}T12:00:00Z`),
  );

const BUTTON = 'display:inline-block;padding:12px 20px;border-radius:6px;background:#0B5563;color:#FFFFFF;font-weight:600;text-decoration:none';
const SMALL = 'color:#53636D;font-size:13px';
const BODY = "max-width:34em;margin:24px auto;padding:0 16px;font:16px/1.5 'Noto Sans',sans-serif;color:#14212B";

const page = (language: Language, title: string, parts: string[]): string =>
  `<!doctype html><html lang="${language}"><head><meta charset="utf-8"><title>${escape(title)}</title></head><body style="${BODY}">${parts.join('')}</body></html>`;

const ENTITIES: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };
export const escape = (text: string): string => text.replace(/[&<>"']/g, (sign) => ENTITIES[sign] ?? sign);
