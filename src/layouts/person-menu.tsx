import { CircleUserRound } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Link, useParams } from 'react-router-dom';
import { membershipAt, useMe } from '../lib/me';
import { paths } from '../paths';
import { Menu, menuItem } from '../ui/menu';
import { landingOf } from './landing';
import { ThemeChoice } from './theme-choice';
import { useSignOut } from './use-sign-out';

interface Props {
  /** Opens above its button, where the button stands at the foot of the page. */
  upward?: boolean;
}

/** Who is signed in, and what belongs to them: profile, light or dark, their other producers, the way out. */
export function PersonMenu({ upward = false }: Props) {
  const { t } = useTranslation();
  const { person } = useMe();
  const signOut = useSignOut();
  return (
    <Menu label={t('nav.person', { name: person.name })} trigger={<Trigger name={person.name} />} upward={upward} align={upward ? 'left' : 'right'}>
      <p className="px-3 pt-2 font-semibold">{person.name}</p>
      <p className="truncate px-3 pb-2 text-small text-ink-3">{person.email}</p>
      <OtherProducers />
      <div className="px-3 py-2">
        <ThemeChoice />
      </div>
      <Link {...menuItem} to={paths.profile()}>
        {t('nav.profile')}
      </Link>
      <button {...menuItem} type="button" onClick={signOut}>
        {t('nav.sign-out')}
      </button>
    </Menu>
  );
}

const Trigger = ({ name }: { name: string }) => (
  <>
    <CircleUserRound aria-hidden size={22} strokeWidth={1.6} />
    <span className="hidden max-w-32 truncate text-body sm:inline">{name}</span>
  </>
);

function OtherProducers() {
  const { t } = useTranslation();
  const { producer } = useParams();
  const me = useMe();
  const here = membershipAt(me, producer)?.membershipId;
  if (me.memberships.length < 2) return null;
  return (
    <nav aria-label={t('nav.producers')} className="border-y border-rule py-1">
      {me.memberships.map((member) => (
        <Link {...menuItem} key={member.membershipId} to={landingOf(member)} aria-current={member.membershipId === here ? 'true' : undefined}>
          <span>
            <span className="block font-semibold">{member.producer.name}</span>
            <span className="block text-small text-ink-3">{t(`roles.${member.role}`)}</span>
          </span>
        </Link>
      ))}
    </nav>
  );
}
