import { useSearchParams } from 'react-router-dom';
import { SignInPage } from '../features/account/sign-in-page';

/** /sign-in */
export function Component() {
  const [search] = useSearchParams();
  return <SignInPage next={search.get('next')} />;
}
