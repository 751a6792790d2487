import { api } from '../../contract';
import { auditView } from '../../db/views/audit';
import { addDays, startOfDay } from '../../domain/civil';
import { route } from '../../http/route';
import { pageOf, readCursor } from '../cursor';

export const auditRoutes = [
  route(api.audit.list, ({ db, producer }, { query }) => {
    const { limit = 50, after, from, to, ...filter } = query;
    const cursor = readCursor(after, ['number']);
    const days = {
      from: from ? startOfDay(from, producer.timeZone) : undefined,
      to: to ? startOfDay(addDays(to, 1), producer.timeZone) : undefined,
    };
    const rows = auditView(db, { ...filter, ...days }, cursor ? Number(cursor[0]) : null, limit + 1);
    const page = pageOf(rows, limit, ({ seq }) => [seq]);
    return { entries: page.rows, next: page.next };
  }),
];
