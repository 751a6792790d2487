import type { Grant, Role } from '../../../server/contract/words';

/** What a role may be given beyond its own rules. */
export const grantsOf = (role: Role | undefined): Grant[] => (role && offered[role]) ?? [];

const offered: Partial<Record<Role, Grant[]>> = { 'store-manager': ['pay-invoices'], 'district-rep': ['read-invoices'] };

/** Ticked for one role, then the role changed: only what the new one is offered goes along. */
export const grantedTo = (role: Role | undefined, ticked: Grant[]): Grant[] => ticked.filter((grant) => grantsOf(role).includes(grant));
