import { useTranslation } from 'react-i18next';
import type { Request } from '../../../server/contract/requests';
import { useFormat, type Format } from '../../lib/format';
import { Tag } from '../../ui/tag';
import { Timeline, TimelineItem, type TimelineTone } from '../../ui/timeline';
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
      <div className="mt-3 ml-1">
        <Timeline label={t('one.story')}>
          {entries.map((entry) => (
            <StoryEntry key={entry.id} entry={entry} format={format} fresh={fresh.has(entry.id)} />
          ))}
        </Timeline>
      </div>
    </section>
  );
}

function StoryEntry({ entry, format, fresh }: { entry: Entry; format: Format; fresh: boolean }) {
  const { t } = useTranslation(['requests', 'common']);
  const { author, kind } = entry;
  // What photos carry is their count.
  const words = kind === 'photos' ? '' : entry.words;
  const by = author ? t('entries.by', { name: author.name, role: t(`common:roles.${author.role}`) }) : t('entries.nilas');
  const when = (
    <>
      {fresh && <Tag tone="fjord">{t('change.fresh')}</Tag>} <time dateTime={new Date(entry.at).toISOString()}>{format.when(entry.at)}</time>
    </>
  );
  return (
    <TimelineItem tone={tones[kind]} by={by} when={when}>
      {kind === 'note' ? <Note words={words} /> : words ? <p className="whitespace-pre-line">{words}</p> : <Happened entry={entry} format={format} />}
    </TimelineItem>
  );
}

/** Never seen by the store, and never looking like what it sees. */
function Note({ words }: { words: string }) {
  const { t } = useTranslation('requests');
  return (
    <div className="rounded-control bg-straw-tint px-4 py-3">
      <p className="text-small text-straw">
        <strong>{t('entries.note')}</strong> · {t('entries.note-hint')}
      </p>
      <p className="mt-0.5 whitespace-pre-line">{words}</p>
    </div>
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
  return <p className="text-ink-2">{kind === 'photos' ? t('entries.photos', { count: Number(entry.words) || 1 }) : t(`entries.${kind}`)}</p>;
}

const tones: Record<Entry['kind'], TimelineTone> = {
  opened: 'quiet',
  reply: 'fjord',
  note: 'straw',
  state: 'quiet',
  assigned: 'quiet',
  photos: 'quiet',
};
