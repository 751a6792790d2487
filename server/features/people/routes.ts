import { api } from '../../contract';
import { accounts, and, contains, districts, isNull, sql } from '../../db';
import { peopleView } from '../../db/views/people';
import { route } from '../../http/route';
import { pageOf, readCursor } from '../cursor';
import { changePerson, inviteAgain, invitePerson, memberOf } from './actions';

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

  route(api.people.places, ({ db }) => ({
    districts: db.select({ id: districts.id, name: districts.name }).from(districts).where(isNull(districts.retiredAt)).orderBy(districts.name).all(),
    accounts: db
      .select({ id: accounts.id, number: accounts.number, name: accounts.name })
      .from(accounts)
      .where(isNull(accounts.retiredAt))
      .orderBy(accounts.name)
      .all(),
  })),
];
