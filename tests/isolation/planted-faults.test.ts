import { afterEach, beforeAll, describe, expect, test, vi } from 'vitest';
import type * as AbilityModule from '../../server/contract/ability';
import type { Viewer } from '../../server/contract/ability';
import { and, eq, memberships, producers, signInLinks, sql, stores } from '../../server/db';
import type * as AllowedModule from '../../server/db/allowed';
import type * as StoreViewsModule from '../../server/db/views/stores';
import type { Services } from '../../server/http/context';
import type * as CrossSiteModule from '../../server/http/cross-site';
import type { AlderMember } from '../cast';
import { testApp, type TestApp, type World } from '../support/server';
import { redemptionFindings } from '../api/redemption';
import { cases, ingestWithKey, type Case } from './cases';
import { crossSiteFindings } from './cross-site';
import { forgotten } from './forgotten-producers';
import { forgetProducer, rewriteStatements, withoutHook } from './sabotage';
import { outsiders, surveyMember, surveyOutsider, surveyOwn, watchWrites } from './survey';

/** Each fault is planted alone, and a small part of the matrix must find it. The matrix itself shows that without it nothing is found. */

type RealAbility = typeof AbilityModule;
type Widen = (ability: ReturnType<RealAbility['abilityFor']>, viewer: Viewer) => void;

const planted = vi.hoisted(() => ({
  everythingAllowed: false,
  widen: undefined as ((ability: never, viewer: never) => void) | undefined,
  crossSite: false,
  tellsOfHiddenStores: false,
}));

vi.mock('../../server/db/allowed', async (original) => {
  const real = await original<typeof AllowedModule>();
  return { ...real, allowed: (...given: Parameters<typeof real.allowed>) => (planted.everythingAllowed ? sql`1` : real.allowed(...given)) };
});
vi.mock('../../server/contract/ability', async (original) => {
  const real = await original<RealAbility>();
  const abilityFor: RealAbility['abilityFor'] = (viewer) => {
    const ability = real.abilityFor(viewer);
    (planted.widen as Widen | undefined)?.(ability, viewer);
    return ability;
  };
  return { ...real, abilityFor };
});
vi.mock('../../server/http/cross-site', async (original) => {
  const real = await original<typeof CrossSiteModule>();
  const refuseCrossSite: typeof real.refuseCrossSite = (baseUrl) => (planted.crossSite ? (_req, _res, next) => next() : real.refuseCrossSite(baseUrl));
  return { refuseCrossSite };
});
vi.mock('../../server/db/views/stores', async (original) => {
  const real = await original<typeof StoreViewsModule>();
  const { problem } = await import('../../server/http/problem');
  const storeView: typeof real.storeView = (db, ability, id) => {
    const found = real.storeView(db, ability, id);
    if (!found && planted.tellsOfHiddenStores && db.find(stores, id)) throw problem('not-allowed');
    return found;
  };
  return { ...real, storeView };
});

let server: TestApp | undefined;
afterEach(async () => {
  Object.assign(planted, { everythingAllowed: false, widen: undefined, crossSite: false, tellsOfHiddenStores: false });
  await server?.close();
});

async function open(world: World = 'all', change?: (services: Services) => Services): Promise<TestApp> {
  server = await testApp(world, change);
  watchWrites(server);
  return server;
}

const PEOPLE: AlderMember[] = ['manager', 'agent', 'dispatcher', 'technician'];
const near = (ids: RegExp): Case[] => cases.filter(({ endpoint }) => ids.test(endpoint.id));

/** What `tests/isolation/two-producers` and the members' own calls say. */
async function ownFindings(test: TestApp, some: Case[], honest: Map<Case, Map<AlderMember, string>>): Promise<string[]> {
  const found: string[] = [];
  for (const one of some) {
    for (const name of PEOPLE) {
      const { answer, findings } = await surveyOwn(test, one, name);
      if (answer !== honest.get(one)?.get(name)) found.push(`${one.endpoint.id} as ${name} differs`);
      found.push(...findings);
    }
  }
  return found;
}

async function memberFindings(test: TestApp, some: Case[], people: AlderMember[]): Promise<string[]> {
  const found: string[] = [];
  for (const one of some) for (const name of people) found.push(...(await surveyMember(test, one, name)));
  return found;
}

async function outsiderFindings(test: TestApp, some: Case[], whom: string): Promise<string[]> {
  const found: string[] = [];
  for (const one of some) {
    for (const [who, email, signedIn] of outsiders) if (who.includes(whom)) found.push(...(await surveyOutsider(test, one, who, email, signedIn)));
  }
  return found;
}

const honest = new Map<Case, Map<AlderMember, string>>();
beforeAll(async () => {
  const alone = await open('alder');
  for (const one of near(/^(accounts|districts|stores|freezers|deliveries|products|models|requests)\./)) {
    const answers = new Map<AlderMember, string>();
    for (const name of PEOPLE) answers.set(name, (await surveyOwn(alone, one, name)).answer);
    honest.set(one, answers);
  }
  await alone.close();
  server = undefined;
});

test.each(forgotten)('a forgotten producer in %s is found', async (_what, calls, statement, column) => {
  const broken = await open();
  const rewritten = rewriteStatements(broken.db, forgetProducer(statement, column));
  const found = await ownFindings(broken, near(calls), honest);
  expect(rewritten.times).toBeGreaterThan(0);
  expect(found).not.toEqual([]);
});

test('without any of them nothing is found', async () => {
  expect(await ownFindings(await open(), [...honest.keys()], honest)).toEqual([]);
});

describe('rules', () => {
  const widenings: [what: string, calls: RegExp, person: AlderMember, widen: Widen][] = [
    ['a store manager may set trucks', /^deliveries\.setNextTruck/, 'manager', (ability, { role }) => role === 'store-manager' && add(ability, 'update', 'NextTruck')],
    ['a store manager may change requests', /^requests\.change/, 'manager', (ability, { role }) => role === 'store-manager' && add(ability, 'update', 'Request')],
    ['a store manager may read notes to staff', /^requests\.read/, 'manager', (ability, { role }) => role === 'store-manager' && add(ability, 'read', 'Note')],
    ['a district rep sees every store', /^stores\.read/, 'storeRep', (ability, { role }) => role === 'district-rep' && add(ability, 'read', 'Store')],
    ['a technician sees trucks', /^stores\./, 'technician', (ability, { role }) => role === 'technician' && add(ability, 'read', 'NextTruck')],
    ['a technician sees trucks in the fleet', /^freezers\.list/, 'technician', (ability, { role }) => role === 'technician' && add(ability, 'read', 'NextTruck')],
    ['a driver may cancel requests', /^requests\.cancel/, 'driver', (ability, { role }) => role === 'driver' && add(ability, 'cancel', 'Request')],
    ['everybody may everything', /^products/, 'manager', (ability) => add(ability, 'read', 'Product')],
  ];
  test.each(widenings)('%s: found', async (_what, calls, person, widen) => {
    planted.widen = widen;
    expect(await memberFindings(await open(), near(calls), [person])).not.toEqual([]);
  });

  test('a rule taken away: found', async () => {
    planted.widen = (ability: Parameters<Widen>[0], { role }: Viewer) => {
      if (role === 'support-agent') ability.update(ability.rules.filter(({ subject }) => subject !== 'Note'));
    };
    expect(await memberFindings(await open(), near(/^requests\.note/), ['agent'])).not.toEqual([]);
  });

  test('rules that are no longer asked of rows: found', async () => {
    planted.everythingAllowed = true;
    expect(await memberFindings(await open(), near(/^(stores|requests)\.read/), ['manager'])).not.toEqual([]);
  });

  test('a store told from none by another problem: found', async () => {
    planted.tellsOfHiddenStores = true;
    expect(await memberFindings(await open(), near(/^stores\.read/), ['manager'])).not.toEqual([]);
  });
});

describe('doors', () => {
  test('no check of other sites: found', async () => {
    planted.crossSite = true;
    expect(await crossSiteFindings(await open('alder'))).not.toEqual([]);
  });

  test('deactivation that nobody asks about: found', async () => {
    const broken = await open('all', (services) => ({
      ...services,
      system: { ...services.system, activePerson: (id) => services.db.get(sql`select id, email, name, language from person where id = ${id}`) },
    }));
    expect(await outsiderFindings(broken, near(/^(me\.read|stores\.list)/), 'deactivated')).not.toEqual([]);
  });

  test('somebody who left still let in: found', async () => {
    const broken = await open('all', (services) => ({
      ...services,
      system: {
        ...services.system,
        membershipAt: (id, slug) => {
          const producer = services.system.producerBySlug(slug);
          const membership = producer && services.db.select().from(memberships).where(and(eq(memberships.producerId, producer.id), eq(memberships.personId, id))).get();
          return membership && { producer, membership };
        },
      },
    }));
    expect(await outsiderFindings(broken, near(/^stores\.list/), 'left')).not.toEqual([]);
  });

  test('the producer of the path taken on trust: found', async () => {
    const broken = await open('all', (services) => ({
      ...services,
      system: {
        ...services.system,
        membershipAt: (id, slug) => {
          const own = services.system.membershipsOf(id)[0];
          const producer = services.system.producerBySlug(slug);
          return own && producer && { producer, membership: { ...own.membership, producerId: producer.id } };
        },
      },
    }));
    expect(await outsiderFindings(broken, near(/^(stores|requests)\.list/), 'strangerAgent')).not.toEqual([]);
  });

  test('a telemetry key that speaks for somebody else: found', async () => {
    const broken = await open('all', (services) => ({
      ...services,
      system: {
        ...services.system,
        producerOfKey: (keyHash, now) => {
          const found = services.system.producerOfKey(keyHash, now);
          const other = services.db.select().from(producers).where(eq(producers.slug, 'twin-ice')).get();
          return found && other && { ...found, producerId: other.id };
        },
      },
    }));
    expect(await memberFindings(broken, [ingestWithKey], ['admin'])).not.toEqual([]);
  });

  /** As two processes would see it: each looks before the other has claimed. */
  const stale = ({ system }: Services) => (tokenHash: string) => {
    const found = system.signInLinkByToken(tokenHash);
    return found && { ...found, usedAt: null };
  };

  test('a sign-in link looked at too early is still claimed once', async () => {
    const raced = await open('alder', (services) => ({ ...services, system: { ...services.system, signInLinkByToken: stale(services) } }));
    expect(await redemptionFindings(raced)).toEqual([]);
  });

  test('a claim that does not ask whether it is the first: found', async () => {
    const broken = await open('alder', (services) => ({
      ...services,
      system: {
        ...services.system,
        signInLinkByToken: stale(services),
        claimLink: (id) => services.db.update(signInLinks).set({ usedAt: 1 }).where(eq(signInLinks.id, id)).returning().get(),
      },
    }));
    expect(await redemptionFindings(broken)).not.toEqual([]);
  });
});

describe('the watch over statements', () => {
  const unscope = (source: string) => (/^select .* from "product"/.test(source) ? source.replace('"product"."producer_id" = ?', '? is not null') : source);

  test('refuses a query that lost its producer', async () => {
    const broken = await open();
    rewriteStatements(broken.db, unscope);
    const found = await memberFindings(broken, near(/^products/), ['agent']);
    expect(found.join()).toMatch(/fails with .*names product without its producer/);
    expect(found.join()).not.toMatch(/is told/);
  });

  test('taken away, the leak itself is found', async () => {
    const broken = await open();
    withoutHook(broken.db);
    rewriteStatements(broken.db, unscope);
    expect((await memberFindings(broken, near(/^products/), ['agent'])).join()).toMatch(/is told/);
  });
});

function add(ability: Parameters<Widen>[0], action: 'read' | 'update' | 'cancel', subject: 'NextTruck' | 'Request' | 'Note' | 'Store' | 'Product'): void {
  ability.update([...ability.rules, { action, subject }]);
}
