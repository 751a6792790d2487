import type { Account } from '../../../server/contract/accounts';

/** What the form about an account starts with. */
export const enteredOf = ({ number, name, terms, language, contacts, version }: Account) => ({ number, name, terms, language, contacts, version });

export type Entered = ReturnType<typeof enteredOf>;

export const noContact = { name: '', work: '', email: '', phone: '' };
