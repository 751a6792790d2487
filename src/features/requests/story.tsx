import { useTranslation } from 'react-i18next';
import type { Request } from '../../../server/contract/requests';
import { useFormat, type Format } from '../../lib/use-format';
import { Tag } from '../../ui/tag';
import { useZone } from './use-zone';

type Entry = Request['entries'][number];

interface Props {
  request: Request;
  fresh: ReadonlySet<string>;
}

/** What happened so far, oldest first; what is new since the page was opened says so. */
export function Story({ request, fresh }: Props) {
  const { t } = useTranslation('requests');
  const format = useFormat(useZone(request));
  // The opening is told in the head.
  const entries = request.entries.filter(({ kind }) => kind !== 'opened');
  return (
    <section className="mt-6" id="story" tabIndex={-1} aria-labelledby="story-title">
      <h2 id="story-title" className="font-bold">
        {t('one.story')}
      </h2>
      {entries.length === 0 && <p className="mt-2 text-ink-3">{t('one.no-story')}</p>}
      <ol className="mt-2">
        {entries.map((entry) => (
          <StoryEntry key={entry.id} entry={entry} format={format} fresh={fresh.has(entry.id)} />
        ))}
      </ol>
    </section>
  );
}

function StoryEntry({ entry, format, fresh }: { entry: Entry; format: Format; fresh: boolean }) {
  const { t } = useTranslation(['requests', 'common']);
  const { author, kind, words } = entry;
  const note = kind === 'note';
  const by = author ? t('entries.by', { name: author.name, role: t(`common:roles.${author.role}`) }) : t('entries.nilas');
  return (
    <li className={note ? 'my-2 rounded-control bg-straw-tint px-4 py-3' : 'border-t border-rule py-3'}>
      <p className="flex flex-wrap items-baseline justify-between gap-x-4 text-small text-ink-3">
        <span>
          {by}
          {note && <strong className="text-straw"> · {t('entries.note')}</strong>}
        </span>
        <span className="flex items-baseline gap-2">
          {fresh && <Tag tone="fjord">{t('change.fresh')}</Tag>}
          <time dateTime={new Date(entry.at).toISOString()}>{format.when(entry.at)}</time>
        </span>
      </p>
      {words ? <p className="mt-0.5 whitespace-pre-line break-words">{words}</p> : <Happened entry={entry} format={format} />}
      {note && <p className="mt-1 text-small text-straw">{t('entries.note-hint')}</p>}
    </li>
  );
}

/** An act without words of its own. */
function Happened({ entry, format }: { entry: Entry; format: Format }) {
  const { t } = useTranslation('requests');
  const { kind, state, day, assignee } = entry;
  if (kind === 'assigned') {
    return <p className="text-ink-2">{assignee ? t('entries.assigned', { name: assignee.name }) : t('entries.unassigned')}</p>;
  }
  if (kind === 'state' && state) {
    const said = state === 'scheduled' && day ? t('states.scheduled-day', { day: format.day(day) }) : t(`states.${state}`);
    return <p className="text-ink-2">{t('entries.state', { state: said })}</p>;
  }
  return <p className="text-ink-2">{t(`entries.${kind}`)}</p>;
}
