import { useTranslation } from 'react-i18next';
import { Link, useLocation } from 'react-router-dom';
import { api } from '../../../server/contract/index';
import { useAct } from '../../api/act';
import { ProblemNote } from '../../form/problem-note';
import { PageTitle } from '../../layouts/page-title';
import { paths } from '../../paths';
import { Button, buttonClass } from '../../ui/button';
import { CodeForm } from './code-form';
import { safeNext } from './safe-next';
import { useEnter } from './use-enter';

/** Where the mail's link leads. Opening it does nothing; the button signs in. */
export function Confirm() {
  const { t } = useTranslation('sign-in');
  const given = new URLSearchParams(useLocation().hash.slice(1));
  const token = given.get('token');
  const next = safeNext(given.get('next'));
  return (
    <>
      <PageTitle title={t('confirm.title')} />
      <h1 className="text-title font-bold">{t('confirm.title')}</h1>
      {token ? <PressToEnter token={token} next={next} /> : <AskAnew words={t('confirm.no-token')} next={next} />}
    </>
  );
}

function PressToEnter({ token, next }: { token: string; next: string | null }) {
  const { t } = useTranslation('sign-in');
  const signIn = useAct(api.auth.signIn, []);
  const enter = useEnter(next);
  const refusal = signIn.error?.type;
  if (refusal === 'link-expired' || refusal === 'too-many-tries') return <AskAnew words={t('confirm.expired')} next={next} />;
  if (refusal === 'link-other-browser') {
    return (
      <>
        <p role="alert" className="mt-2 mb-6 text-ink-2">
          {t('confirm.other-browser')}
        </p>
        <CodeForm token={token} next={next} />
        <AnotherLink next={next} />
      </>
    );
  }
  return (
    <>
      <p className="mt-2 mb-6 text-ink-2">{t('confirm.lead')}</p>
      <Button wide size="big" busy={signIn.isPending} onClick={() => signIn.mutate({ body: { token } }, { onSuccess: enter })}>
        {t('confirm.button')}
      </Button>
      {signIn.error && <ProblemNote problem={signIn.error} />}
    </>
  );
}

function AskAnew({ words, next }: { words: string; next: string | null }) {
  return (
    <>
      <p role="alert" className="mt-2 mb-6 text-ink-2">
        {words}
      </p>
      <AnotherLink next={next} />
    </>
  );
}

function AnotherLink({ next }: { next: string | null }) {
  const { t } = useTranslation('sign-in');
  return (
    <p className="mt-4">
      <Link to={paths.signIn(next ?? undefined)} className={buttonClass('quiet', { size: 'big' })}>
        {t('confirm.new')}
      </Link>
    </p>
  );
}
