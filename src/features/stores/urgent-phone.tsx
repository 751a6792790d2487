import { Phone } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { StorePage } from '../../../server/contract/stores';
import type { Answers } from '../../../server/domain/answers';
import { useMembership } from '../../lib/me';
import { phoneLink, phoneText } from '../../lib/phone-link';
import { useUrgentPhone } from './use-urgent-phone';

interface Props {
  store: StorePage['store'];
  answers: Answers;
}

/** The urgent phone, only where something cannot wait for a form. */
export function UrgentPhone({ store, answers }: Props) {
  const { t } = useTranslation('store');
  const { name } = useMembership().producer;
  const urgentPhone = useUrgentPhone(store);
  if (!isUrgent(answers) || !urgentPhone) return null;
  return (
    <a
      href={phoneLink(urgentPhone)}
      className="mt-3 flex min-h-12 items-center gap-2.5 rounded-card border border-rust bg-rust-tint px-5 py-2.5 font-semibold text-rust"
    >
      <Phone aria-hidden size={20} className="shrink-0" />
      {t('freezer.urgent', { producer: name, phone: phoneText(urgentPhone) })}
    </a>
  );
}

const isUrgent = ({ full, cold, coming }: Answers): boolean =>
  cold.said.key === 'warm' || full.said.key === 'empty' || coming?.said.key === 'late' || coming?.said.key === 'missed';
