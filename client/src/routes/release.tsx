import { useParams } from 'react-router-dom';
import { ReleasePage } from '../features/release/release-page';

/** /versions/:id/release */
export function Component() {
  const { id = '' } = useParams();
  return <ReleasePage key={id} id={id} />;
}
