import type { Membership } from '../../server/contract/auth';
import type { Role } from '../../server/contract/words';
import { paths } from '../paths';

/** The most useful page there is for a member, by role. */
export const landingOf = (member: Membership): string => landings[member.role](member);

const storesOf = ({ producer }: Membership) => paths.stores(producer.slug);
const freezersOf = ({ producer }: Membership) => paths.freezers(producer.slug);
const requestsOf = ({ producer }: Membership) => paths.requests(producer.slug);

const landings: Record<Role, (member: Membership) => string> = {
  'store-manager': (member) => {
    const [only, ...more] = member.storeIds;
    return only && more.length === 0 ? paths.store(member.producer.slug, only) : storesOf(member);
  },
  'district-rep': storesOf,
  'support-agent': requestsOf,
  dispatcher: freezersOf,
  driver: ({ producer }) => paths.stores(producer.slug, '?truck=today'),
  technician: ({ producer }) => paths.requests(producer.slug, '?assignee=me'),
  'producer-admin': freezersOf,
};
