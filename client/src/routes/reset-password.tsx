import { useParams } from 'react-router-dom';
import { ResetPasswordPage } from '../features/account/password-pages';

/** /reset-password/:token */
export function Component() {
  const { token = '' } = useParams();
  return <ResetPasswordPage token={token} />;
}
