import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { PageTitle } from '../../layouts/page-title';
import { useMembership } from '../../lib/me';
import { paths } from '../../paths';
import { linkClass } from '../../ui/link-class';

interface Props {
  title: string;
  lead: string;
  children: ReactNode;
}

/** Around the forms about one person: the way back to the list, and what the form is for. */
export function PersonFrame({ title, lead, children }: Props) {
  const { t } = useTranslation('people');
  const { slug } = useMembership().producer;
  return (
    <div className="max-w-2xl px-4 py-5 lg:px-7 lg:py-6">
      <PageTitle title={title} />
      <Link to={paths.people(slug)} className={linkClass()}>
        {t('all')}
      </Link>
      <h1 className="text-title font-bold wrap-anywhere">{title}</h1>
      <p className="mt-1 mb-5 text-ink-2 wrap-anywhere">{lead}</p>
      {children}
    </div>
  );
}
