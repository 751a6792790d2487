import { alderPeople } from '../cast';
import { cookieOf, type TestApp } from '../support/server';
import { call } from './call';
import { cases, ingestWithKey } from './cases';

const unsafe = [...cases, ingestWithKey].filter(({ endpoint }) => endpoint.method !== 'get');

/** Every unsafe route, asked by another site in each way a browser would; answers what was not refused. */
export async function crossSiteFindings(test: TestApp): Promise<string[]> {
  const found: string[] = [];
  const cookie = cookieOf(test, alderPeople.admin.email);
  const none = { 'sec-fetch-site': '' };
  const strangers: [string, Record<string, string>][] = [
    ['another site', { 'sec-fetch-site': 'cross-site' }],
    ['a sister site', { 'sec-fetch-site': 'same-site' }],
    ['another origin', { ...none, origin: 'https://elsewhere.example' }],
    ['an opaque origin', { ...none, origin: 'null' }],
    ['a cookie with neither header', none],
  ];
  for (const one of unsafe) {
    for (const [who, headers] of strangers) {
      const answer = await test.undone(() => call(test, { ...one, headers: { ...one.headers, ...headers } }, cookie));
      if (answer.status !== 403 || !answer.body.includes('cross-site')) found.push(`${one.endpoint.id} from ${who}: ${answer.status}`);
    }
  }
  return found;
}

/** The same routes from where they may be called; answers what was refused as if from another site. */
export async function sameSiteFindings(test: TestApp): Promise<string[]> {
  const found: string[] = [];
  const cookie = cookieOf(test, alderPeople.admin.email);
  const friends: [string, Record<string, string>, string | null][] = [
    ['the portal', { 'sec-fetch-site': 'same-origin' }, cookie],
    ['the address bar', { 'sec-fetch-site': 'none' }, cookie],
    ['the portal in an old browser', { 'sec-fetch-site': '', origin: 'http://portal.example' }, cookie],
    ['a program without a cookie', { 'sec-fetch-site': '' }, null],
  ];
  for (const one of unsafe) {
    for (const [who, headers, session] of friends) {
      const answer = await test.undone(() => call(test, { ...one, headers: { ...one.headers, ...headers } }, session));
      if (answer.body.includes('cross-site')) found.push(`${one.endpoint.id} from ${who}: ${answer.status}`);
    }
  }
  return found;
}
