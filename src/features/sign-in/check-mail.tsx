import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { api } from '../../../server/contract/index';
import { useAct } from '../../api/act';
import { ProblemNote } from '../../form/problem-note';
import { paths } from '../../paths';
import { Button } from '../../ui/button';
import { CodeForm } from './code-form';

interface Props {
  email: string;
  next: string | null;
}

/** The mail is on its way, or not: this page does not know, and says the same. */
export function CheckMail({ email, next }: Props) {
  const { t } = useTranslation('sign-in');
  const again = useAct(api.auth.requestLink, []);
  return (
    <>
      <h1 className="text-title font-bold">{t('check.title')}</h1>
      <p className="mt-2 text-ink-2">{t('check.lead', { email })}</p>
      <p className="mt-2 mb-6 text-small text-ink-3">{t('check.ten')}</p>
      <CodeForm next={next} />
      <div className="mt-6 flex flex-wrap items-center gap-x-5 gap-y-2">
        <Button
          variant="quiet"
          busy={again.isPending}
          onClick={() => again.mutate({ body: { email, next: next ?? undefined } })}
        >
          {t('check.again')}
        </Button>
        <Link to={paths.signIn(next ?? undefined)} className="font-semibold text-fjord underline underline-offset-4">
          {t('check.other')}
        </Link>
      </div>
      <p role="status" className="mt-3 text-ink-2">
        {again.isSuccess && t('check.sent-again')}
      </p>
      {again.error && <ProblemNote problem={again.error} />}
    </>
  );
}
