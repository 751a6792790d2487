import { api } from '../../contract';
import { accounts, and, contains, districts, isNull, sql, type ProducerDb } from '../../db';
import { peopleView } from '../../db/views/people';
import { beginSeeing } from '../../http/seeing';
import { route } from '../../http/route';
import { pageOf, readCursor } from '../cursor';
import { changePerson, inviteAgain, invitePerson, memberOf, seeAs } from './actions';

export const peopleRoutes = [
  route(api.people.list, ({ db }, { query }) => {
    const { limit = 50, role, q } = query;
    const cursor = readCursor(query.after, ['string', 'string']);
    const where = and(
      role ? sql`m.role = ${role}` : undefined,
      q ? contains(q, sql`p.name`, sql`p.email`) : undefined,
      cursor ? sql`(p.name, m.id) > (${cursor[0]}, ${cursor[1]})` : undefined,
    );
    const page = pageOf(peopleView(db, where ?? sql`1`, limit + 1), limit, ({ name, id }) => [name, id]);
    return { people: page.rows, next: page.next };
  }),

  route(api.people.invite, (ctx, { body }) => memberOf(ctx.db, invitePerson(ctx, body))),

  route(api.people.change, (ctx, { params, body }) => {
    changePerson(ctx, params.memberId, body);
    return memberOf(ctx.db, params.memberId);
  }),

  route(api.people.inviteAgain, (ctx, { params }) => {
    inviteAgain(ctx, params.memberId);
    return undefined;
  }),

  route(api.people.seeAs, (ctx, { params, req }) => {
    seeAs(ctx, params.memberId);
    beginSeeing(req, ctx.producer.slug, params.memberId, ctx.now);
    return undefined;
  }),

  route(api.people.places, ({ db, ability }) => ({
    districts: db.select({ id: districts.id, name: districts.name }).from(districts).where(isNull(districts.retiredAt)).orderBy(districts.name).all(),
    accounts: ability.can('read', 'Account') ? accountsInUse(db) : [],
  })),
];

const accountsInUse = (db: ProducerDb) =>
  db
    .select({ id: accounts.id, number: accounts.number, name: accounts.name })
    .from(accounts)
    .where(isNull(accounts.retiredAt))
    .orderBy(accounts.name)
    .all();
