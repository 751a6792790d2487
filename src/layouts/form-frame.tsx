import type { ReactNode } from 'react';
import { ChevronLeft } from 'lucide-react';
import { Link } from 'react-router-dom';
import { PageTitle } from './page-title';

interface Props {
  title: string;
  lead?: string;
  /** The way back, and its words. */
  back: string;
  backTo: string;
  children: ReactNode;
}

/** Around a form that fills its page: the way back, and what the form is for. */
export const FormFrame = ({ title, lead, back, backTo, children }: Props) => (
  <div className="mx-auto max-w-2xl px-4 py-5 lg:px-7 lg:py-6">
    <PageTitle title={title} />
    <Link to={back} className="-ml-1 inline-flex min-h-12 items-center gap-1 font-semibold text-fjord">
      <ChevronLeft aria-hidden size={20} />
      {backTo}
    </Link>
    <h1 className="text-title font-bold wrap-anywhere">{title}</h1>
    {lead && <p className="mt-1 text-ink-2">{lead}</p>}
    <div className="mt-5">{children}</div>
  </div>
);
