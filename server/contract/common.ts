import * as z from 'zod/mini';
import { languages } from './words';

/** Faults are keys of `locales/<language>/validation.json`; no server English reaches a screen. */
export const fault = (key: string) => ({ error: key });

export const id = z.uuid(fault('id'));
export const slug = z.string().check(z.regex(/^[a-z][a-z0-9-]{1,38}[a-z0-9]$/));
export const language = z.enum(languages, fault('choice'));
/** Milliseconds since 1970-01-01 UTC. */
export const instant = z.int(fault('number')).check(z.minimum(0, fault('number')), z.maximum(8.64e15, fault('number')));
/** A local calendar day. */
export const day = z.iso.date(fault('day'));
export const timeOfDay = z.string().check(z.regex(/^([01]\d|2[0-3]):[0-5]\d$/, fault('time')));

const CONTROL = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]/g;
/** Words a person wrote: control characters out, ends trimmed, length limited. */
export const words = (max: number, min = 0) =>
  z.string(fault('text')).check(
    z.overwrite((text) => text.replace(CONTROL, '').trim()),
    z.minLength(min, fault('required')),
    z.maxLength(max, fault('too-long')),
  );

export const email = z
  .string(fault('email'))
  .check(z.overwrite((text) => text.trim().toLowerCase()), z.maxLength(254, fault('email')), z.email(fault('email')));

export const producerParams = z.strictObject({ producer: slug });
export const withProducer = <S extends z.core.$ZodLooseShape>(shape: S) => z.strictObject({ producer: slug, ...shape });

const count = (least: number, most: number) =>
  z.pipe(
    z.pipe(z.string(), z.transform(Number)),
    z.int(fault('number')).check(z.minimum(least, fault('number')), z.maximum(most, fault('number'))),
  );
/** Keyset paging: `after` is the opaque cursor the page before gave. */
export const paging = {
  after: z.optional(z.string().check(z.maxLength(400))),
  limit: z.optional(count(1, 200)),
};
export const nextCursor = z.nullable(z.string());

/** What a writer saw; grows with every change. */
export const version = z.int(fault('number'));
export const phone = words(40);
/** A measure in inches or pounds. */
export const measure = (least: number, most: number) => z.number(fault('measure')).check(z.minimum(least, fault('measure')), z.maximum(most, fault('measure')));
export const timeZone = z.string(fault('choice')).check(z.maxLength(60, fault('choice')), z.refine(isTimeZone, fault('time-zone')));
/** Hours on some days of the week, by local clocks. */
export const span = z.strictObject({
  days: z.array(z.literal([1, 2, 3, 4, 5, 6, 7])).check(z.minLength(1, fault('weekdays')), z.maxLength(7, fault('weekdays'))),
  from: timeOfDay,
  to: timeOfDay,
}).check(z.refine(({ from, to }) => from < to, { error: 'span-backwards', path: ['to'] }));
export const spans = z.array(span).check(z.maxLength(14, fault('too-long')));

/** What is retired is in a list only when asked for. */
export const withRetired = z.strictObject({ retired: z.optional(z.literal('too')) });

/** What a list is searched for. */
export const search = z.optional(z.string().check(z.maxLength(120)));

function isTimeZone(name: string): boolean {
  try {
    return new Intl.DateTimeFormat('en', { timeZone: name }).resolvedOptions().timeZone.length > 0;
  } catch {
    return false;
  }
}
