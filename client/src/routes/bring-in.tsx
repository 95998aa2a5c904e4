import { useSearchParams } from 'react-router-dom';
import { BringInPage } from '../features/bring-in/bring-in-page';

/** /bring-in and /bring-in?pair=… */
export function Component() {
  const [search] = useSearchParams();
  const pairId = search.get('pair');
  return <BringInPage key={pairId} pairId={pairId} />;
}
