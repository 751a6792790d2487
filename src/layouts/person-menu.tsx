import { CircleUserRound } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Link, useParams } from 'react-router-dom';
import { membershipAt, useMe } from '../lib/me';
import { landingOf } from './landing';
import { paths } from '../paths';
import { ThemeChoice } from './theme-choice';
import { useSignOut } from './use-sign-out';

const id = 'person-menu';

interface Props {
  /** Opens above its button, where the button stands at the foot of the page. */
  upward?: boolean;
}

/** Who is signed in, and what belongs to them: profile, light or dark, their other producers, the way out. */
export function PersonMenu({ upward }: Props) {
  const { t } = useTranslation();
  const { person } = useMe();
  const place = upward ? 'top-14 right-3 lg:top-auto lg:right-auto lg:bottom-16 lg:left-3.5' : 'top-16 right-3 sm:right-6';
  return (
    <>
      <button
        type="button"
        popoverTarget={id}
        aria-label={t('nav.person', { name: person.name })}
        className="inline-flex min-h-11 items-center gap-2 rounded-control px-1 text-small text-ink-2"
      >
        <CircleUserRound aria-hidden size={22} strokeWidth={1.6} />
        <span className="hidden max-w-32 truncate sm:inline">{person.name}</span>
      </button>
      <div id={id} popover="auto" className={`fixed inset-auto m-0 w-72 rounded-card border border-rule bg-surface p-2 text-ink shadow-lg ${place}`}>
        <Inside />
      </div>
    </>
  );
}

function Inside() {
  const { t } = useTranslation();
  const { person } = useMe();
  const signOut = useSignOut();
  const close = () => document.getElementById(id)?.hidePopover();
  return (
    <>
      <p className="px-3 pt-2 font-semibold">{person.name}</p>
      <p className="truncate px-3 pb-2 text-small text-ink-3">{person.email}</p>
      <OtherProducers onChosen={close} />
      <div className="px-3 py-2">
        <ThemeChoice />
      </div>
      <Link to={paths.profile()} onClick={close} className={item}>
        {t('nav.profile')}
      </Link>
      <button type="button" onClick={signOut} className={`${item} w-full text-left`}>
        {t('nav.sign-out')}
      </button>
    </>
  );
}

function OtherProducers({ onChosen }: { onChosen: () => void }) {
  const { t } = useTranslation();
  const { producer } = useParams();
  const me = useMe();
  const { memberships } = me;
  const here = membershipAt(me, producer)?.membershipId;
  if (memberships.length < 2) return null;
  return (
    <nav aria-label={t('nav.producers')} className="border-y border-rule py-1">
      {memberships.map((member) => (
        <Link
          key={member.membershipId}
          to={landingOf(member)}
          onClick={onChosen}
          aria-current={member.membershipId === here ? 'true' : undefined}
          className={`${item} flex-col items-start justify-center`}
        >
          <span className="font-semibold">{member.producer.name}</span>
          <span className="text-small text-ink-3">{t(`roles.${member.role}`)}</span>
        </Link>
      ))}
    </nav>
  );
}

const item = 'flex min-h-11 items-center rounded-control px-3 hover:bg-sunk aria-[current=true]:bg-fjord-tint';
