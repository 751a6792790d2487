import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { PageTitle } from '../../layouts/page-title';
import { linkClass } from '../../ui/link-class';

interface Props {
  title: string;
  back: { to: string; name: string };
  children: ReactNode;
}

/** Around the forms about one account: the way back, and what the form is for. */
export const AccountFrame = ({ title, back, children }: Props) => (
  <div className="max-w-2xl px-4 py-5 lg:px-7 lg:py-6">
    <PageTitle title={title} />
    <Link to={back.to} className={linkClass()}>
      {back.name}
    </Link>
    <h1 className="mb-5 text-title font-bold wrap-anywhere">{title}</h1>
    {children}
  </div>
);
