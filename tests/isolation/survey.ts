import { sql } from '../../server/db';
import { ownedTables } from '../../server/db/statement-hook';
import type { Mail } from '../../server/ports/mail';
import { alder, alderPeople, birch, birchPeople, lotWord, noteWord, twin, type AlderMember } from '../cast';
import { idOf } from '../factories';
import { cookieOf, waitingMail, type TestApp } from '../support/server';
import { call, same, shown, type Answer, type Swap } from './call';
import type { Case, Thing } from './cases';

/** Calls a case in every way a member of Alder might, and says what is not as it must be. */
export async function surveyMember(test: TestApp, one: Case, name: AlderMember, email: string = alderPeople[name].email): Promise<string[]> {
  const ask = asking(test, one, cookieOf(test, email), wordsHiddenFrom(name));
  const own = await ask({});
  const found = own.status === expectedOf(one, name) ? [] : [`own things: ${shown(own)} and not ${expectedOf(one, name)}`];
  for (const [slot, thing] of slotsOf(one)) found.push(...(await surveySlot(ask, one, name, slot, thing)));
  // Whoever works with Birch too sees it there.
  const strangers = email === alderPeople.both.email ? MALFORMED_SLUGS : [birch.slug, twin.slug, ...MALFORMED_SLUGS];
  found.push(...(await surveyProducer(ask, one, { strangers })));
  return [...found, ...ask.findings].map((finding) => `${one.endpoint.id} as ${name}, ${finding}`);
}

/** Nobody from outside gets in, nor learns what is there. */
export async function surveyOutsider(test: TestApp, one: Case, who: string, email: string | null, signedIn: boolean): Promise<string[]> {
  const ask = asking(test, one, email && cookieOf(test, email), [alder.mark, twin.mark]);
  const own = await ask({});
  const found: string[] = [];
  const kind = one.endpoint.access.kind;
  const wanted = kind === 'may' ? (signedIn ? 404 : 401) : kind === 'person' && !signedIn ? 401 : one.status;
  if (own.status !== wanted) found.push(`Alder's things: ${shown(own)} and not ${wanted}`);
  for (const [slot, { own: there }] of slotsOf(one)) {
    const absent = await ask({ [slot]: absentOf(there) });
    if (kind === 'may' && !same(absent, own)) found.push(`can tell ${slot} there from not there: ${shown(own)} / ${shown(absent)}`);
  }
  found.push(...(await surveyProducer(ask, one, { reference: own, strangers: ['nowhere-ice'] })));
  return [...found, ...ask.findings].map((finding) => `${one.endpoint.id} as ${who}, ${finding}`);
}

/** A member's own call, and what its answer and mails say besides what changes from call to call. */
export async function surveyOwn(test: TestApp, one: Case, name: AlderMember): Promise<{ answer: string; findings: string[] }> {
  const ask = asking(test, one, cookieOf(test, alderPeople[name].email), wordsHiddenFrom(name));
  const { status, headers, body } = await ask({});
  const mails = JSON.stringify(ask.mails).replace(/token=[\w.-]+/g, 'token').replace(/\b\d{6}\b/g, 'code');
  const expected = expectedOf(one, name);
  const wrong = status === expected ? [] : [`own things: ${status} and not ${expected}`];
  return { answer: [status, headers, body, mails].join('\n'), findings: [...wrong, ...ask.findings] };
}

type Ask = ((swap: Swap) => Promise<Answer>) & { findings: string[]; mails: Mail[] };

/** Each call is made and undone; what must hold whatever is called is looked at here. */
function asking(test: TestApp, one: Case, cookie: string | null, hidden: string[]): Ask {
  const findings: string[] = [];
  const written: Mail[] = [];
  const ask = (swap: Swap) =>
    test.undone(async () => {
      test.resetIds();
      test.log.length = 0;
      const answer = await call(test, one, cookie, swap);
      const told = JSON.stringify(swap);
      if (answer.status >= 500) findings.push(`fails with ${told}: ${shown(answer)} ${test.log.join('').slice(0, 300)}`);
      const mails = waitingMail(test);
      written.push(...mails);
      // A sign-in mail goes to its own address, whoever asked for it.
      const letters = one.endpoint.access.kind === 'public' ? [] : mails.map((mail) => JSON.stringify(mail));
      const said = [answer.body, answer.headers, ...test.log, ...letters].join('\n');
      if (one.endpoint.access.kind !== 'dev') for (const word of hidden) if (said.includes(word)) findings.push(`is told ${word} with ${told}`);
      const strayed = mails.filter(({ to }) => !alderAddresses.has(to) && to !== one.invites);
      if (strayed.length > 0) findings.push(`writes to ${strayed.map(({ to }) => to).join(', ')} with ${told}`);
      const { alders, others } = traces(test);
      if (others.length > 0) findings.push(`writes for another producer (${others.join(', ')}) with ${told}`);
      if (one.endpoint.access.kind === 'may' && answer.status >= 400 && alders.length > 0) findings.push(`is refused and writes (${alders.join(', ')}) with ${told}`);
      return answer;
    });
  return Object.assign(ask, { findings, mails: written });
}

const alderAddresses = new Set<string>(Object.values(alderPeople).map(({ email }) => email));

async function surveySlot(ask: Ask, one: Case, name: AlderMember, slot: string, thing: Thing): Promise<string[]> {
  const found: string[] = [];
  const absent = await ask({ [slot]: absentOf(thing.own) });
  if (slot.startsWith('path') && absent.status < 400) found.push(`${slot} absent: ${shown(absent)}`);
  const foreign = await ask({ [slot]: foreignOf(thing.own) });
  if (!same(absent, foreign)) found.push(`can tell ${slot} foreign from absent: ${shown(foreign)} / ${shown(absent)}`);
  if (thing.sibling && (ALWAYS_ELSEWHERE.includes(slot) || narrow.includes(name))) {
    const sibling = await ask({ [slot]: thing.sibling });
    if (!same(absent, sibling)) found.push(`can tell ${slot} of another store from absent: ${shown(sibling)} / ${shown(absent)}`);
  }
  for (const malformed of slot.startsWith('path') ? MALFORMED_PATH : MALFORMED) {
    const answer = await ask({ [slot]: malformed });
    if (slot.startsWith('path') && !same(answer, absent)) found.push(`can tell ${slot} malformed from absent: ${shown(answer)} / ${shown(absent)}`);
    if (one.endpoint.access.kind === 'may' && answer.status < 400) found.push(`${slot} malformed: ${shown(answer)}`);
  }
  return found;
}

/** A producer that is not the caller's is the same as none. */
async function surveyProducer(ask: Ask, one: Case, { reference, strangers }: { reference?: Answer; strangers: string[] }): Promise<string[]> {
  if (one.endpoint.access.kind !== 'may') return [];
  const absent = reference ?? (await ask({ 'path.producer': 'nowhere-ice' }));
  const found = absent.status === 404 || absent.status === 401 ? [] : [`no producer: ${shown(absent)}`];
  for (const slug of strangers) {
    const answer = await ask({ 'path.producer': slug });
    if (!same(answer, absent)) found.push(`can tell producer ${slug} from none: ${shown(answer)} / ${shown(absent)}`);
  }
  return found;
}

const MALFORMED_SLUGS = ['B!', 'x%2f..', '%27--'];
const MALFORMED_PATH = ['not-an-id', '%27%20or%201%3D1--', '..%2f..%2fx', '%00', 'x'.repeat(300)];
const MALFORMED = ['not-an-id', "' or 1=1--", { $ne: '' }, ['x']];

const absentOf = (own: string): string => (own.startsWith('urn:') ? 'urn:dev:ow:nowherelantern' : idOf('nowhere', own));
/** Birch's thing of the same name. */
function foreignOf(own: string): string {
  if (own.startsWith('urn:')) return own.replace('alder', 'birch');
  return birchByAlder.get(own) ?? idOf('birch', 'lantern');
}
const THINGS = [
  ...['lantern', 'north', 'south', 'chain', 'corner', 'lantern freezer', 'lantern sensor', 'model', 'small bag'],
  ...['cold request', 'lantern sooner', 'cold request photo'],
];
const birchByAlder = new Map([
  ...THINGS.map((thing): [string, string] => [idOf(alder.namespace, thing), idOf(birch.namespace, thing)]),
  ...(['agent', 'technician'] as const).map((role): [string, string] => [idOf(alder.namespace, role), idOf(birch.namespace, role === 'agent' ? 'strangerAgent' : 'strangerTechnician')]),
]);

function slotsOf({ path, query, named }: Case): [string, Thing][] {
  const queried = Object.entries(query ?? {}).flatMap(([name, value]): [string, Thing][] => (typeof value === 'string' ? [] : [[name, value]]));
  return [
    ...Object.entries(path ?? {}).map(([name, thing]): [string, Thing] => [`path.${name}`, thing]),
    ...queried.map(([name, thing]): [string, Thing] => [`query.${name}`, thing]),
    ...Object.entries(named ?? {}).map(([name, thing]): [string, Thing] => [`body.${name}`, thing]),
  ];
}

function expectedOf({ endpoint, allowed = [], hidden = [], status }: Case, name: AlderMember): number {
  if (endpoint.access.kind !== 'may') return status ?? 200;
  if (allowed.includes(name)) return endpoint.status ?? (endpoint.answer === 'nothing' ? 204 : 200);
  return hidden.includes(name) ? 404 : 403;
}

/** Who has nothing to do with juniper. */
const narrow: AlderMember[] = ['manager', 'storeRep', 'driver', 'technician'];
/** A freezer of another store is wrong in a body whoever asks, and so is a photo of another request. */
const ALWAYS_ELSEWHERE = ['body.freezerId', 'path.photoId'];

function wordsHiddenFrom(name: AlderMember): string[] {
  const words = [birch.mark, twin.mark];
  if (['manager', 'otherManager', 'managerOfThree', 'storeRep'].includes(name)) words.push(noteWord);
  if (name === 'technician') words.push(lotWord, '"nextTruck":{"day"', '"nextTruck":{"from"', '"truck":{"from"');
  return words;
}

/** Which rows were written in the call under way: of Alder, or of somebody else. */
function traces({ db }: TestApp): { alders: string[]; others: string[] } {
  const rows = db.all<{ whose: string; what: string }>(sql`select whose, what from trace`);
  const of = (whose: string) => rows.filter((row) => row.whose === whose).map(({ what }) => what);
  return { alders: of('alder'), others: of('other') };
}

/** Has SQLite itself note each row that is written, for `traces`. */
export function watchWrites({ db }: TestApp): void {
  const own = idOf(alder.slug, 'producer');
  const note = (table: string, verb: string, version: string) =>
    `create temp trigger "${table} ${verb}" after ${verb} on "${table}" begin
       insert into trace values (case when ${version}.producer_id = '${own}' then 'alder' else 'other' end, '${verb} ${table}'); end`;
  db.$client.exec('create temp table trace (whose text, what text)');
  for (const table of ownedTables) {
    for (const [verb, version] of [['insert', 'new'], ['update', 'old'], ['delete', 'old']] as const) db.$client.exec(note(table, verb, version));
  }
}

/** Everybody who is not a working member of Alder, and whether they are somebody at all. */
export const outsiders: [who: string, email: string | null, signedIn: boolean][] = [
  ['anonymous', null, false],
  ['a deactivated person', alderPeople.gone.email, false],
  ['somebody who left', alderPeople.left.email, true],
  ...Object.entries(birchPeople)
    .filter(([name]) => name !== 'both')
    .map(([name, { email }]): [string, string, boolean] => [`Birch's ${name}`, email, true]),
];
