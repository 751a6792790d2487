import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Request } from '../../../server/contract/requests';
import { useMembership } from '../../lib/me';
import { useFormat } from '../../lib/format';
import { paths } from '../../paths';
import { DefinitionList } from '../../ui/definition-list';

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
  const store = (
    <Link to={paths.store(producer.slug, request.storeId)} className="text-fjord underline underline-offset-4">
      {request.store}
    </Link>
  );
  return (
    <DefinitionList
      items={[
        { term: t('one.store'), detail: store },
        { term: t('one.freezer'), detail: request.freezer ?? t('one.whole-store') },
        ...(assignee ? [{ term: t('one.assignee'), detail: request.assignee?.name ?? t('list.unassigned') }] : []),
        ...(request.scheduledDay ? [{ term: t('one.visit'), detail: format.day(request.scheduledDay) }] : []),
      ]}
    />
  );
}
