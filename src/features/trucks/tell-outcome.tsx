import { useEffect, useRef } from 'react';
import { useTranslation } from 'react-i18next';
import { ProblemNote } from '../../form/problem-note';
import { Notice } from '../../ui/notice';
import type { Outcome, Telling } from './use-telling';

interface Props {
  telling: Telling;
}

/** What came of the last telling. The list is long and the pressed button may be gone, so the person is led here. */
export function TellOutcome({ telling: { outcome, problem } }: Props) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (outcome || problem) box.current?.focus();
  }, [outcome, problem]);
  return (
    <div ref={box} tabIndex={-1} className="mb-3 grid scroll-mt-6 gap-3 empty:hidden">
      {problem && <ProblemNote problem={problem} />}
      {outcome && <Told outcome={outcome} />}
    </div>
  );
}

function Told({ outcome: { told, refused } }: { outcome: Outcome }) {
  const { t } = useTranslation('trucks');
  return (
    <>
      {told > 0 && <Notice tone="good" role="status" title={t('told', { count: told })} />}
      {refused > 0 && (
        <Notice tone="caution" role="alert" title={t('refused', { count: refused })}>
          {t('refused-help')}
        </Notice>
      )}
    </>
  );
}
