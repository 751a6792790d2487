import { useTranslation } from 'react-i18next';
import type { Result } from '../../../server/contract/endpoint';
import { api } from '../../../server/contract/index';
import { useAct } from '../../api/act';
import { ProblemNote } from '../../form/problem-note';
import { useFormat } from '../../lib/format';
import { Button } from '../../ui/button';
import { Tag } from '../../ui/tag';

interface Props {
  sessions: Result<typeof api.me.sessions>['sessions'];
}

/** Every place this person is signed in, and the way to end each. This one ends by signing out. */
export function Sessions({ sessions }: Props) {
  const { t } = useTranslation('profile');
  const format = useFormat();
  const end = useAct(api.me.endSession, [api.me.sessions]);
  return (
    <section>
      <h2 className="font-bold">{t('sessions.title')}</h2>
      <p className="text-ink-2">{t('sessions.lead')}</p>
      <ul className="mt-2 border-t border-rule">
        {sessions.map(({ handle, device, seenAt, createdAt, current }) => (
          <li key={handle} className="flex items-center justify-between gap-4 border-b border-rule py-3">
            <div className="min-w-0">
              <p className="break-words">{device}</p>
              <p className="text-small text-ink-3">
                {t('sessions.seen', { when: format.when(seenAt) })} · {t('sessions.since', { when: format.when(createdAt) })}
              </p>
            </div>
            {current ? (
              <Tag tone="fjord">{t('sessions.this')}</Tag>
            ) : (
              <Button
                variant="quiet"
                label={t('sessions.end-of', { device })}
                busy={end.isPending && end.variables.params.handle === handle}
                onClick={() => end.mutate({ params: { handle } })}
              >
                {t('sessions.end')}
              </Button>
            )}
          </li>
        ))}
      </ul>
      <p role="status" className="mt-2 text-ink-2">
        {end.isSuccess && t('sessions.ended')}
      </p>
      {end.error && <ProblemNote problem={end.error} />}
    </section>
  );
}
