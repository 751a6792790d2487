import type { RequestSummary } from '../../../server/contract/requests';
import { RequestLink } from './request-link';

interface Props {
  requests: RequestSummary[];
  now: number;
}

export const RequestLinks = ({ requests, now }: Props) => (
  <ul className="divide-y divide-rule">
    {requests.map((request) => (
      <li key={request.id}>
        <RequestLink request={request} now={now} />
      </li>
    ))}
  </ul>
);
