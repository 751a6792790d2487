import { Outlet, useParams } from 'react-router-dom';
import { membershipAt, useMe } from '../lib/me';
import { NobodyLayout } from './nobody';
import { StaffLayout } from './staff-layout';
import { StoreLayout } from './store-layout';

/** The frame of a signed-in person, by the side they stand on; outside a producer's paths, that of the one last used. */
export function MemberLayout() {
  const { producer } = useParams();
  const member = membershipAt(useMe(), producer);
  if (!member) return <NobodyLayout />;
  const Layout = member.side === 'store' ? StoreLayout : StaffLayout;
  return (
    <Layout member={member}>
      <Outlet />
    </Layout>
  );
}
