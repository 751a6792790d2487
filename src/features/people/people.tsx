import { useTranslation } from 'react-i18next';
import { Link, useLocation } from 'react-router-dom';
import type { QueryInput, Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import { roles } from '../../../server/contract/words';
import { page, type Place } from '../../api/page';
import { q } from '../../api/query';
import { PageTitle } from '../../layouts/page-title';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { Pager } from '../../table/pager';
import { buttonClass } from '../../ui/button';
import { Notice } from '../../ui/notice';
import { doneOf } from './done';
import { NoPeople } from './no-people';
import { PeopleFilters } from './people-filters';
import { PeopleTable } from './people-table';

export const peoplePage = page({
  words: ['people'],
  queries: (place) => ({ found: q(api.people.list, { params: { producer: place.params.producer ?? '' }, query: queryOf(place) }) }),
  View: People,
});

/** Everybody who works with the producer's portal, and what each of them sees. */
function People({ found }: { found: Result<typeof api.people.list> }) {
  const { t } = useTranslation('people');
  const { slug } = useMembership().producer;
  // What another page did before it led here.
  const before = doneOf(useLocation().state);
  const done = before && t(`done.${before.act}`, { name: before.name });
  return (
    <div className="px-4 py-5 lg:px-7 lg:py-6">
      <PageTitle title={t('title')} />
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h1 className="text-title font-bold">{t('title')}</h1>
        <Link to={paths.invite(slug)} className={buttonClass()}>
          {t('invite.title')}
        </Link>
      </div>
      <p className="mt-1 max-w-prose text-ink-2">{t('lead')}</p>
      <PeopleFilters />
      <div role="status" className="mb-4 empty:hidden">
        {done && <Notice tone="good" title={done} />}
      </div>
      {found.people.length === 0 ? <NoPeople /> : <PeopleTable people={found.people} />}
      <Pager next={found.next} />
    </div>
  );
}

function queryOf({ search }: Place): QueryInput<typeof api.people.list> {
  return {
    role: roles.find((known) => known === search.get('role')),
    q: search.get('q')?.slice(0, 120) || undefined,
    after: search.get('after') ?? undefined,
    limit: '25',
  };
}
