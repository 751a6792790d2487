import { useTranslation } from 'react-i18next';
import { api } from '../../../server/contract/index';
import { page } from '../../api/page';
import { q } from '../../api/query';
import { KeptLanguageSwitch } from '../../layouts/kept-language-switch';
import { PageTitle } from '../../layouts/page-title';
import { ThemeChoice } from '../../layouts/theme-choice';
import { useIsSeeing } from '../../layouts/use-seeing';
import { useSignOut } from '../../layouts/use-sign-out';
import { useMe } from '../../lib/me';
import { Button } from '../../ui/button';
import { NameForm } from './name-form';
import { Sessions } from './sessions';

export const profile = page({
  words: ['profile'],
  queries: () => ({ mine: q(api.me.sessions, {}) }),
  View: ({ mine }) => <Profile sessions={mine.sessions} />,
});

/** A person about themselves. */
function Profile({ sessions }: Parameters<typeof Sessions>[0]) {
  const { t } = useTranslation('profile');
  const signOut = useSignOut();
  const { person } = useMe();
  const isSeeing = useIsSeeing();
  return (
    <div className="grid max-w-2xl gap-8 px-4 py-6 lg:px-7">
      <PageTitle title={t('title')} />
      <header>
        <h1 className="text-title font-bold">{t('title')}</h1>
        <p className="text-ink-3">{person.email}</p>
      </header>
      <NameForm name={person.name} />
      {!isSeeing && (
        <section>
          <h2 className="mb-2 font-bold">{t('language')}</h2>
          <span className="inline-flex">
            <KeptLanguageSwitch />
          </span>
        </section>
      )}
      <section className="max-w-sm">
        <h2 className="mb-2 font-bold">{t('theme')}</h2>
        <ThemeChoice />
      </section>
      <Memberships />
      <Sessions sessions={sessions} />
      <div>
        <Button variant="quiet" onClick={signOut}>
          {t('sign-out')}
        </Button>
      </div>
    </div>
  );
}

function Memberships() {
  const { t } = useTranslation(['profile', 'common']);
  const { memberships } = useMe();
  if (memberships.length === 0) return null;
  return (
    <section>
      <h2 className="font-bold">{t('memberships')}</h2>
      <ul className="mt-2 border-t border-rule">
        {memberships.map(({ membershipId, role, producer, storeIds }) => (
          <li key={membershipId} className="border-b border-rule py-3">
            {t('at', { role: t(`common:roles.${role}`), producer: producer.name })}
            {storeIds.length > 0 && <p className="text-small text-ink-3">{t('stores', { count: storeIds.length })}</p>}
          </li>
        ))}
      </ul>
    </section>
  );
}
