import { useParams } from 'react-router-dom';
import { FirstAdministratorPage } from '../features/account/first-administrator-page';

/** /first-administrator/:token */
export function Component() {
  const { token = '' } = useParams();
  return <FirstAdministratorPage token={token} />;
}
