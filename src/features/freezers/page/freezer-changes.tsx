import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Result } from '../../../../server/contract/endpoint';
import { api } from '../../../../server/contract/index';
import { Problem } from '../../../api/call';
import { q } from '../../../api/query';
import { ProblemNote } from '../../../form/problem-note';
import { useMembership } from '../../../lib/me';
import { paths } from '../../../paths';
import { linkClass } from '../../../ui/link-class';
import { Section } from '../../../ui/section';
import { Skeleton } from '../../../ui/skeleton';
import { Actor } from '../../audit/actor';
import { ChangeDetails } from '../../audit/change-details';
import { ChangeTime } from '../../audit/change-time';

/** What changed about this freezer and its sensor, and who did it. */
export function FreezerChanges({ freezerId }: { freezerId: string }) {
  const { t } = useTranslation('freezer-page');
  const { slug } = useMembership().producer;
  const { data, error } = useQuery(q(api.audit.list, { params: { producer: slug }, query: { subjectId: freezerId, limit: '10' } }));
  return (
    <Section title={t('changes.title')}>
      {error instanceof Problem && <ProblemNote problem={error} />}
      {!data && !error && <Skeleton className="mt-3 h-24" />}
      {data && (data.entries.length === 0 ? <p className="py-3 text-ink-2">{t('changes.none')}</p> : <Entries entries={data.entries} />)}
      <Link to={paths.changes(slug, freezerId)} className={linkClass('big')}>
        {t('changes.all')}
      </Link>
    </Section>
  );
}

type Entry = Result<typeof api.audit.list>['entries'][number];

function Entries({ entries }: { entries: Entry[] }) {
  const { t } = useTranslation('audit');
  return (
    <ol className="divide-y divide-rule">
      {entries.map(({ seq, at, actor, act, subject, changes }) => (
        <li key={seq} className="grid gap-x-4 gap-y-1 py-3 sm:grid-cols-[8.5rem_10rem_minmax(0,1fr)]">
          <div>
            <ChangeTime at={at} />
          </div>
          <div>
            <Actor actor={actor} />
          </div>
          <div>
            <p>{t([`acts.${act}`, 'other-act'], { act })}</p>
            <ChangeDetails subject={subject} changes={changes} />
          </div>
        </li>
      ))}
    </ol>
  );
}
