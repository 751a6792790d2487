import type { RequestSummary } from '../../contract/requests';
import { memberById, membersByRole, managersOfStore, type MemberRow } from '../../db/views/people';
import type { ActionTx, ProducerContext } from '../../http/context';
import { dayInWords, kindInWords, type MailTemplate } from '../mail/compose';

interface News {
  ctx: ProducerContext;
  tx: ActionTx;
  request: Pick<RequestSummary, 'id' | 'number' | 'kind' | 'store' | 'storeId' | 'assignee' | 'scheduledDay'>;
  words?: string;
}

/** Writes to the store's people, each in their own language, but not to whoever caused the news. */
export const tellStore = (news: News, template: MailTemplate): void => tell(news, template, managersOfStore(news.tx.db, news.request.storeId));

/** Writes to whoever has the request, or to all who could take it. */
export function tellStaff(news: News, template: MailTemplate): void {
  const { assignee, kind } = news.request;
  const holder = assignee ? memberById(news.tx.db, assignee.id) : undefined;
  tell(news, template, holder ? [holder] : membersByRole(news.tx.db, kind === 'ice-sooner' ? ['support-agent', 'dispatcher'] : ['support-agent']));
}

export function tellMember(news: News, template: MailTemplate, membershipId: string): void {
  const member = memberById(news.tx.db, membershipId);
  if (member) tell(news, template, [member]);
}

function tell({ ctx, tx, request, words = '' }: News, template: MailTemplate, readers: MemberRow[]): void {
  const author = memberById(tx.db, ctx.viewer.membershipId)?.name ?? '';
  for (const { id, email, language } of readers) {
    const own = id === ctx.viewer.membershipId;
    if (own && template !== 'request-filed-store') continue;
    tx.mail({
      template,
      to: email,
      language,
      path: `/${ctx.producer.slug}/requests/${request.id}`,
      params: {
        number: request.number,
        store: request.store,
        producer: ctx.producer.name,
        what: kindInWords(language, request.kind),
        day: request.scheduledDay ? dayInWords(language, request.scheduledDay) : '',
        author,
        words,
      },
    });
  }
}
