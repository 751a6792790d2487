import { useTranslation } from 'react-i18next';
import { subjects } from '../../../server/contract/ability';
import { day } from '../../../server/contract/common';
import type { QueryInput, Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import { page, type Place } from '../../api/page';
import { q } from '../../api/query';
import { PageTitle } from '../../layouts/page-title';
import { Pager } from '../../table/pager';
import { useFilters } from '../../table/use-filters';
import { EmptyState } from '../../ui/states';
import { CardTable } from '../../table/card-table';
import { Actor } from './actor';
import { ChangeDetails } from './change-details';
import { ChangeFilters } from './change-filters';
import { ChangeTime } from './change-time';
import { shortId } from './short-id';

type Trail = Result<typeof api.audit.list>;

export const changesPage = page({
  // The kinds and states of requests are among the changed values.
  words: ['audit', 'requests'],
  queries: (place) => ({
    trail: q(api.audit.list, { params: { producer: place.params.producer ?? '' }, query: queryOf(place) }),
  }),
  View: Changes,
});

/** Who did what and when, youngest first. */
function Changes({ trail }: { trail: Trail }) {
  const { t } = useTranslation('audit');
  return (
    <div className="px-4 py-5 lg:px-7 lg:py-6">
      <PageTitle title={t('title')} />
      <h1 className="text-title font-bold">{t('title')}</h1>
      <p className="mt-1 max-w-prose text-ink-2">{t('lead')}</p>
      <ChangeFilters />
      {trail.entries.length === 0 ? <NoChanges /> : <Rows entries={trail.entries} />}
      <Pager next={trail.next} />
    </div>
  );
}

function Rows({ entries }: Pick<Trail, 'entries'>) {
  const { t } = useTranslation('audit');
  const columns = (['when', 'who', 'act', 'subject', 'changes'] as const).map((column) => t(`columns.${column}`));
  const rows = entries.map(({ seq, at, actor, act, subject, subjectId, changes }) => ({
    id: String(seq),
    cells: [
      <ChangeTime key="when" at={at} />,
      <Actor key="who" actor={actor} />,
      t([`acts.${act}`, 'other-act'], { act }),
      <span key="subject">
        {t(`subjects.${subject}`)} <span className="text-small whitespace-nowrap text-ink-3">{shortId(subjectId)}</span>
      </span>,
      <ChangeDetails key="changes" changes={changes} />,
    ],
  }));
  return <CardTable label={t('title')} columns={columns} rows={rows} />;
}

function NoChanges() {
  const { t } = useTranslation('audit');
  const state = useFilters().any ? 'nothing' : 'empty';
  return <EmptyState title={t(`${state}.title`)}>{t(`${state}.words`)}</EmptyState>;
}

/** A filter the contract does not know is left out rather than refused: links are typed and shortened by people. */
function queryOf({ search }: Place): QueryInput<typeof api.audit.list> {
  return {
    subject: subjects.find((known) => known === search.get('subject')),
    from: day.safeParse(search.get('from')).data,
    to: day.safeParse(search.get('to')).data,
    after: search.get('after') ?? undefined,
  };
}
