import type { TestApp } from '../support/server';
import type { Case, Thing } from './cases';

/** What came back, as far as a caller can tell two answers apart. */
export interface Answer {
  status: number;
  headers: string;
  body: string;
}

/** Values put in place of the case's own, by slot: `path.storeId`, `query.store`, `body.freezerId`. */
export type Swap = Record<string, unknown>;

const COMPARED = ['content-type', 'cache-control', 'etag', 'location', 'retry-after'];

export async function call(test: TestApp, { endpoint, path, query, named, body, form, headers }: Case, cookie: string | null, swap: Swap = {}): Promise<Answer> {
  const filled = endpoint.path.replace(/:(\w+)/g, (_, name: string) => String(swap[`path.${name}`] ?? path?.[name]?.own ?? 'alder-ice'));
  const asked = Object.entries(query ?? {}).map(([name, value]) => [name, String(swap[`query.${name}`] ?? ownOf(value))]);
  const search = asked.length > 0 ? `?${new URLSearchParams(asked).toString()}` : '';
  const things = Object.fromEntries(Object.entries(named ?? {}).map(([name, { own }]) => [name, swap[`body.${name}`] ?? own]));
  const response = await fetch(`${test.url}${filled}${search}`, {
    method: endpoint.method.toUpperCase(),
    redirect: 'manual',
    headers: sent({ 'sec-fetch-site': 'same-origin', ...(body ? { 'content-type': 'application/json' } : {}), ...headers, ...(cookie ? { cookie } : {}) }),
    body: form ? form() : body ? JSON.stringify(body(things)) : undefined,
  });
  const text = Buffer.from(await response.arrayBuffer()).toString('latin1');
  const told = withoutEcho(text, swap);
  return {
    status: response.status,
    headers: COMPARED.map((name) => `${name}: ${name === 'etag' && told !== text ? '' : (response.headers.get(name) ?? '')}`).join('\n'),
    body: told,
  };
}

/** What the caller itself named in the body is no news; an answer's tag, made of its text, would tell it again. */
const withoutEcho = (text: string, swap: Swap): string =>
  Object.entries(swap).reduce((left, [slot, value]) => (slot.startsWith('body.') && typeof value === 'string' ? left.replaceAll(value, slot) : left), text);

/** A header of no length is left out. */
const sent = (headers: Record<string, string>) => Object.fromEntries(Object.entries(headers).filter(([, value]) => value !== ''));

const ownOf = (value: Thing | string): string => (typeof value === 'string' ? value : value.own);

export const same = (a: Answer, b: Answer): boolean => a.status === b.status && a.headers === b.headers && a.body === b.body;

export const shown = ({ status, body }: Answer): string => `${status} ${body.slice(0, 120)}`;
