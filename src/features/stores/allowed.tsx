import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { row, type Action, type Subject } from '../../../server/contract/ability';
import { FailureFrame } from '../../layouts/failure';
import { useAbility } from '../../lib/me';

interface Props {
  to: Action;
  what: Subject;
  /** What the rules ask about. */
  where: Record<string, unknown>;
  children: ReactNode;
}

/** A page for an act the person may not do says so at once, not after the form is filled in. */
export function Allowed({ to, what, where, children }: Props) {
  const { t } = useTranslation('problems');
  if (useAbility().can(to, row(what, where))) return children;
  return <FailureFrame title={t('not-allowed.title')} words={t('not-allowed.help')} />;
}
