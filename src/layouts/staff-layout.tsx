import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { Membership } from '../../server/contract/auth';
import { KeptLanguageSwitch } from './kept-language-switch';
import { landingOf } from './landing';
import { Brand } from '../ui/brand';
import { PersonMenu } from './person-menu';
import { ProducerName } from './producer-name';
import { StaffSections } from './staff-sections';

interface Props {
  member: Membership;
  children: ReactNode;
}

/** Around the pages of the producer's people: sections at the left, or along the bottom of a phone. */
export function StaffLayout({ member, children }: Props) {
  return (
    <div className="min-h-[calc(100dvh-var(--banner))] lg:grid lg:grid-cols-[196px_minmax(0,1fr)]">
      <header className="flex items-center justify-between gap-3 border-b border-rule bg-surface px-4 py-2.5 lg:sticky lg:top-(--banner) lg:h-[calc(100dvh-var(--banner))] lg:flex-col lg:items-stretch lg:justify-start lg:border-r lg:border-b-0 lg:px-3.5 lg:py-5">
        <Link to={landingOf(member)} className="rounded-control lg:px-2 lg:pb-3">
          <Brand />
        </Link>
        <StaffSections slug={member.producer.slug} />
        <div className="flex items-center gap-2 lg:mt-auto lg:flex-col lg:items-start lg:gap-3 lg:px-2">
          <div className="hidden lg:block">
            <ProducerName producer={member.producer} />
          </div>
          <KeptLanguageSwitch />
          <span className="lg:hidden">
            <PersonMenu />
          </span>
          <span className="hidden lg:-ml-2 lg:block">
            <PersonMenu upward />
          </span>
        </div>
      </header>
      <main id="main" tabIndex={-1} className="min-w-0 pb-20 outline-none lg:pb-0">
        {children}
      </main>
    </div>
  );
}
