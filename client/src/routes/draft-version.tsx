import { useParams } from 'react-router-dom';
import { DraftVersionPage } from '../features/versions/draft-version-page';

/** /fits/:id/draft */
export function Component() {
  const { id = '' } = useParams();
  return <DraftVersionPage key={id} fitId={id} />;
}
