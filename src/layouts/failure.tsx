import type { ReactNode } from 'react';
import { useQueryClient } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { isRouteErrorResponse, Link, useRevalidator, useRouteError } from 'react-router-dom';
import { Problem } from '../api/call';
import { Button, buttonClass } from '../ui/button';
import { paths } from '../paths';
import { PageTitle } from './page-title';

/** What a page shows when it cannot be shown: nothing here, not allowed, no connection, or our own fault. */
export const Failure = () => <FailureOf problem={problemOf(useRouteError())} />;

/** The same where no layout stands around it. */
export const FailurePage = () => (
  <main id="main" tabIndex={-1} className="outline-none">
    <Failure />
  </main>
);

/** A path that leads nowhere. */
export const NotFound = () => <FailureOf problem={new Problem('not-found', 404)} />;

function FailureOf({ problem }: { problem: Problem }) {
  const { t } = useTranslation(['problems', 'common']);
  const title = t(`${problem.type}.title`);
  return (
    <FailureFrame title={title} words={t(`${problem.type}.help`)}>
      {problem.type === 'not-signed-in' ? (
        <Link to={paths.signIn(location.pathname + location.search)} className={buttonClass()}>
          {t('common:failed.sign-in')}
        </Link>
      ) : (
        <WhatNow problem={problem} />
      )}
      {problem.requestId && <p className="w-full text-small text-ink-3">{t('common:failed.reference', { id: problem.requestId })}</p>}
    </FailureFrame>
  );
}

function WhatNow({ problem }: { problem: Problem }) {
  const { t } = useTranslation();
  const retry = useRetry();
  const hopeless = problem.type === 'not-found' || problem.type === 'not-allowed';
  return (
    <>
      {!hopeless && <Button onClick={retry}>{t('failed.retry')}</Button>}
      <Link to={paths.home()} className="font-semibold text-fjord underline underline-offset-4">
        {t('failed.home')}
      </Link>
    </>
  );
}

/** A page that did not load has no route data to keep: forget what failed and ask for it again. */
function useRetry() {
  const queryClient = useQueryClient();
  const { revalidate } = useRevalidator();
  return () => {
    queryClient.removeQueries({ predicate: ({ state }) => state.status === 'error' });
    void revalidate();
  };
}

export function FailureFrame({ title, words, children }: { title: string; words: string; children?: ReactNode }) {
  return (
    <section className="mx-auto w-full max-w-xl px-4 py-16">
      <PageTitle title={title} />
      <h1 className="text-title font-bold">{title}</h1>
      <p className="mt-2 text-ink-2">{words}</p>
      <div className="mt-6 flex flex-wrap items-center gap-4">{children}</div>
    </section>
  );
}

function problemOf(error: unknown): Problem {
  if (error instanceof Problem) return error;
  if (isRouteErrorResponse(error) && error.status === 404) return new Problem('not-found', 404);
  // A page's own code that did not arrive is a lost connection, or a newer release that replaced it.
  const unreached = error instanceof TypeError && /import|module|fetch/i.test(error.message);
  return unreached ? new Problem('offline', 0) : new Problem('server-error', 500);
}
