import { useTranslation } from 'react-i18next';
import { Outlet } from 'react-router-dom';
import { useMe } from '../lib/me';
import { FailureFrame } from './failure';
import { KeptLanguageSwitch } from './kept-language-switch';
import { Brand } from '../ui/brand';
import { PersonMenu } from './person-menu';

/** The frame of somebody whom no producer has given a role. */
export function NobodyLayout() {
  return (
    <>
      <header className="flex items-center justify-between px-4 py-3 sm:px-6">
        <Brand />
        <div className="flex items-center gap-2">
          <KeptLanguageSwitch />
          <PersonMenu />
        </div>
      </header>
      <main id="main" tabIndex={-1} className="px-4 outline-none">
        <Outlet />
      </main>
    </>
  );
}

/** Says so, and whom to ask. */
export function Nobody() {
  const { t } = useTranslation();
  const { person } = useMe();
  return <FailureFrame title={t('nobody.title')} words={t('nobody.words', { email: person.email })} />;
}
