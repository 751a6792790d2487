import { useTranslation } from 'react-i18next';
import type { Problem } from '../api/call';
import { paths } from '../paths';
import { Notice } from '../ui/notice';

/** What the server refused, in the person's language, with what to do about it. */
export function ProblemNote({ problem }: { problem: Problem }) {
  const { t } = useTranslation(['problems', 'common']);
  return (
    <Notice tone={problem.type === 'offline' ? 'offline' : 'bad'} title={t(`${problem.type}.title`)} role="alert">
      <p>{t(`${problem.type}.help`, problem.params)}</p>
      {problem.type === 'not-signed-in' && (
        <a href={paths.signIn()} target="_blank" rel="noreferrer" className="font-semibold text-fjord underline underline-offset-4">
          {t('common:failed.sign-in')}
        </a>
      )}
      {problem.requestId && <p className="text-small text-ink-2">{t('common:failed.reference', { id: problem.requestId })}</p>}
    </Notice>
  );
}
