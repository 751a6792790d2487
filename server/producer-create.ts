import path from 'node:path';
import { parseArgs } from 'node:util';
import * as z from 'zod/mini';
import { configOrLeave } from './config';
import { email } from './contract/common';
import { languages, reservedSlugs } from './contract/words';
import { createProducer } from './features/producers/create';
import { openServices } from './start';

/** `npm run producer:create -- --name … --slug …`: the operator's way to a new producer and its first admin. */
const { values } = parseArgs({
  options: {
    name: { type: 'string' },
    slug: { type: 'string' },
    'time-zone': { type: 'string', default: 'America/Chicago' },
    language: { type: 'string', default: 'en' },
    'urgent-phone': { type: 'string', default: '' },
    'admin-name': { type: 'string' },
    'admin-email': { type: 'string' },
  },
});

const wanted = z.object({
  name: z.string().check(z.minLength(2), z.maxLength(120)),
  slug: z.string().check(
    z.regex(/^[a-z][a-z0-9-]{1,38}[a-z0-9]$/, { error: 'small letters, digits and hyphens, 3 to 40' }),
    z.refine((slug) => !reservedSlugs.includes(slug), { error: 'is reserved' }),
  ),
  timeZone: z.string().check(z.refine(isTimeZone, { error: 'is not an IANA time zone' })),
  language: z.enum(languages),
  urgentPhone: z.string(),
  adminName: z.string().check(z.minLength(2)),
  adminEmail: email,
});

const parsed = wanted.safeParse({
  ...values,
  timeZone: values['time-zone'],
  urgentPhone: values['urgent-phone'],
  adminName: values['admin-name'],
  adminEmail: values['admin-email'],
});
if (!parsed.success) {
  console.error(z.prettifyError(parsed.error));
  console.error('Usage: npm run producer:create -- --name "Name" --slug slug --admin-name "Name" --admin-email address [--time-zone America/Chicago] [--language en|es] [--urgent-phone number]');
  process.exit(2);
}

const root = path.resolve(import.meta.dirname, '../..');
const services = openServices(configOrLeave('development'), root);
const made = createProducer(services, parsed.data);
services.db.$client.close();
if (!made) {
  console.error(`There is a producer at "${parsed.data.slug}" already.`);
  process.exit(1);
}
console.log(`${parsed.data.name} is at /${parsed.data.slug}; ${parsed.data.adminEmail} can ask for a sign-in link now.`);
console.log(`Telemetry key, shown only here: ${made.telemetryKey}`);

function isTimeZone(zone: string): boolean {
  try {
    return Boolean(new Intl.DateTimeFormat('en', { timeZone: zone }));
  } catch {
    return false;
  }
}
