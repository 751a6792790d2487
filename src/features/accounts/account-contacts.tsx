import { useTranslation } from 'react-i18next';
import type { Account } from '../../../server/contract/accounts';
import { phoneLink } from '../../lib/phone-link';
import { linkClass } from '../../ui/link-class';

type Contacts = Account['contacts'];

/** Whom to write to or call; a press does it. */
export function AccountContacts({ contacts }: { contacts: Contacts }) {
  const { t } = useTranslation('accounts');
  return (
    <section aria-labelledby="contacts">
      <h2 id="contacts" className="text-lead font-bold">
        {t('contacts.title')}
      </h2>
      {contacts.length === 0 ? (
        <p className="mt-2 text-ink-2">{t('contacts.none')}</p>
      ) : (
        <ul className="divide-y divide-rule">
          {contacts.map((contact, i) => (
            <Contact key={i} {...contact} />
          ))}
        </ul>
      )}
    </section>
  );
}

const Contact = ({ name, work, email, phone }: Contacts[number]) => (
  <li className="py-2.5">
    <p className="font-semibold wrap-anywhere">{name}</p>
    {work && <p className="text-ink-2 wrap-anywhere">{work}</p>}
    <p className="flex flex-wrap gap-x-5 wrap-anywhere">
      {email && (
        <a href={`mailto:${email}`} className={linkClass()}>
          {email}
        </a>
      )}
      {phone && (
        <a href={phoneLink(phone)} className={linkClass()}>
          {phone}
        </a>
      )}
    </p>
  </li>
);
