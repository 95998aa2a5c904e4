import { useParams } from 'react-router-dom';
import { WithdrawPage } from '../features/release/withdraw-page';

/** /versions/:id/withdraw */
export function Component() {
  const { id = '' } = useParams();
  return <WithdrawPage key={id} id={id} />;
}
