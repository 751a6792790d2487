import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { MemberOf } from '../../../server/contract/people';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { CardTable } from '../../table/card-table';
import { buttonClass } from '../../ui/button';
import { Tag } from '../../ui/tag';
import { Assigned } from './assigned';

export function PeopleTable({ people }: { people: MemberOf[] }) {
  const { t } = useTranslation(['people', 'common']);
  const { slug } = useMembership().producer;
  const columns = [t('name'), t('role'), t('assigned.title'), t('common:language.label'), t('state'), t('acts')];
  const rows = people.map((member) => ({
    id: member.id,
    cells: [
      <Who key="who" {...member} />,
      <Role key="role" {...member} />,
      <Assigned key="assigned" {...member} />,
      t(`common:language.${member.language}`),
      <Active key="state" active={member.active} />,
      <Link key="acts" to={paths.person(slug, member.id)} aria-label={t('change.of', { name: member.name })} className={buttonClass('quiet')}>
        {t('change.button')}
      </Link>,
    ],
  }));
  return <CardTable label={t('title')} columns={columns} rows={rows} />;
}

const Who = ({ name, email }: MemberOf) => (
  <>
    {name}
    <span className="block text-small font-normal text-ink-3 lg:min-w-52">{email}</span>
  </>
);

function Role({ role, side }: MemberOf) {
  const { t } = useTranslation(['people', 'common']);
  return (
    <>
      {t(`common:roles.${role}`)}
      {role === 'district-rep' && <span className="block text-small text-ink-3">{t(`side.${side}`)}</span>}
    </>
  );
}

function Active({ active }: { active: boolean }) {
  const { t } = useTranslation('people');
  return active ? (
    <Tag tone="kelp" shape="dot">
      {t('states.active')}
    </Tag>
  ) : (
    <Tag shape="ring">{t('states.deactivated')}</Tag>
  );
}
