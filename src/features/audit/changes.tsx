import { useTranslation } from 'react-i18next';
import type { Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import { urlOf } from '../../api/call';
import { page, type Place } from '../../api/page';
import { q } from '../../api/query';
import { PageTitle } from '../../layouts/page-title';
import { useMembership } from '../../lib/me';
import { CsvLink } from '../../table/csv-link';
import { Pager } from '../../table/pager';
import { queryFrom } from '../../table/query-from';
import { useFilters } from '../../table/use-filters';
import { EmptyState } from '../../ui/states';
import { CardTable } from '../../table/card-table';
import { Actor } from './actor';
import { ChangeDetails } from './change-details';
import { ChangeFilters } from './change-filters';
import { ChangeTime } from './change-time';
import { isId, shortId } from './short-id';
import { changeNouns } from './value-words';

type Trail = Result<typeof api.audit.list>;

export const changesPage = page({
  words: changeNouns,
  queries: (place) => ({
    trail: q(api.audit.list, { params: { producer: place.params.producer ?? '' }, query: queryFrom(api.audit.list, [...filterNames, 'after'], place.search) }),
  }),
  View: Changes,
});

/** Who did what and when, youngest first. */
function Changes({ trail, place }: { trail: Trail; place: Place }) {
  const { t } = useTranslation('audit');
  const { slug } = useMembership().producer;
  return (
    <div className="px-4 py-5 lg:px-7 lg:py-6">
      <PageTitle title={t('title')} />
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h1 className="text-title font-bold">{t('title')}</h1>
        <CsvLink href={urlOf(api.audit.csv, { producer: slug }, queryFrom(api.audit.csv, filterNames, place.search))} />
      </div>
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
        {t(`subjects.${subject}`)} {isId(subjectId) && <span className="text-small whitespace-nowrap text-ink-3">{shortId(subjectId)}</span>}
      </span>,
      <ChangeDetails key="changes" subject={subject} changes={changes} />,
    ],
  }));
  return <CardTable label={t('title')} columns={columns} rows={rows} />;
}

function NoChanges() {
  const { t } = useTranslation('audit');
  const state = useFilters().any ? 'nothing' : 'empty';
  return <EmptyState title={t(`${state}.title`)}>{t(`${state}.words`)}</EmptyState>;
}

const filterNames = ['subject', 'subjectId', 'actor', 'from', 'to'] as const;
