import { useState } from 'react';
import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { api } from '../../../../server/contract/index';
import { Problem } from '../../../api/call';
import { q } from '../../../api/query';
import { ProblemNote } from '../../../form/problem-note';
import { useMembership } from '../../../lib/me';
import { paths } from '../../../paths';
import { SearchBox } from '../../../table/search-box';
import { Dialog } from '../../../ui/dialog';
import { Skeleton } from '../../../ui/skeleton';

interface Props {
  open: boolean;
  serial: string;
  /** The freezer it hangs in now. */
  from: string;
  onClose: () => void;
}

/** To which freezer the sensor goes; tying it there is the act, on that freezer's page. */
export function MoveSensor({ open, serial, from, onClose }: Props) {
  const { t } = useTranslation(['freezer-page', 'common']);
  const [words, setWords] = useState('');
  return (
    <Dialog open={open} title={t('move.title', { serial })} onClose={onClose} closeLabel={t('common:close')}>
      <p className="mb-3">{t('move.words')}</p>
      <search className="flex">
        <SearchBox label={t('move.search')} hint={t('move.hint')} value={words} onSearch={setWords} />
      </search>
      {words && <Found words={words} serial={serial} from={from} />}
    </Dialog>
  );
}

function Found({ words, serial, from }: { words: string; serial: string; from: string }) {
  const { t } = useTranslation('freezer-page');
  const { slug } = useMembership().producer;
  const { data, error } = useQuery({
    ...q(api.freezers.list, { params: { producer: slug }, query: { q: words, limit: '10' } }),
    placeholderData: keepPreviousData,
  });
  if (error instanceof Problem) return <ProblemNote problem={error} />;
  if (!data) return <Skeleton className="mt-3 h-24" />;
  const others = data.freezers.filter(({ id }) => id !== from);
  return (
    <>
      <p role="status" className="mt-3 text-small text-ink-3">
        {others.length === 0 ? t('move.nothing') : t('move.found', { count: others.length })}
      </p>
      <ul className="divide-y divide-rule">
        {others.map(({ id, name, store, serial: there }) => (
          <li key={id}>
            <Link to={paths.tieSensor(slug, id, serial)} className="group block min-h-12 py-2.5">
              <span className="block font-semibold text-fjord group-hover:underline">{name}</span>
              <span className="block text-small text-ink-2">{there ? t('move.taken', { store, serial: there }) : t('move.free', { store })}</span>
            </Link>
          </li>
        ))}
      </ul>
      {data.next && <p className="text-small text-ink-3">{t('move.narrow')}</p>}
    </>
  );
}
