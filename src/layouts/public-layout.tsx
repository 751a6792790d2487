import { Outlet } from 'react-router-dom';
import { LanguageSwitch } from './language-switch';
import { Brand } from '../ui/brand';

/** Around pages anybody may open: our mark, the language, one card. */
export function PublicLayout() {
  return (
    <div className="flex min-h-dvh flex-col">
      <header className="flex items-center justify-between px-4 py-4 sm:px-6">
        <Brand />
        <LanguageSwitch />
      </header>
      <main id="main" tabIndex={-1} className="mx-auto w-full max-w-md px-4 pt-[8vh] pb-16 outline-none">
        <Outlet />
      </main>
    </div>
  );
}
