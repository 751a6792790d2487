import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Request } from '../../../server/contract/requests';
import { useMembership } from '../../lib/me';
import { useFormat } from '../../lib/use-format';
import { paths } from '../../paths';

interface Props {
  request: Request;
  /** False where the form beside it says who has it. */
  assignee: boolean;
}

/** Where it is, who has it and when somebody comes. */
export function Facts({ request, assignee }: Props) {
  const { t } = useTranslation('requests');
  const { producer } = useMembership();
  const format = useFormat();
  return (
    <dl className="grid gap-4">
      <Fact name={t('one.store')}>
        <Link to={paths.store(producer.slug, request.storeId)} className="font-semibold text-fjord underline underline-offset-4">
          {request.store}
        </Link>
      </Fact>
      <Fact name={t('one.freezer')}>{request.freezer ?? t('one.whole-store')}</Fact>
      {assignee && <Fact name={t('one.assignee')}>{request.assignee?.name ?? t('list.unassigned')}</Fact>}
      {request.scheduledDay && <Fact name={t('one.visit')}>{format.day(request.scheduledDay)}</Fact>}
    </dl>
  );
}

const Fact = ({ name, children }: { name: string; children: ReactNode }) => (
  <div>
    <dt className="text-small font-semibold text-ink-3">{name}</dt>
    <dd>{children}</dd>
  </div>
);
