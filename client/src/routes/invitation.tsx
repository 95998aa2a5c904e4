import { useParams } from 'react-router-dom';
import { InvitationPage } from '../features/account/invitation-page';

/** /invitation/:token */
export function Component() {
  const { token = '' } = useParams();
  return <InvitationPage token={token} />;
}
