import { useParams } from 'react-router-dom';
import { WorkspacePage } from '../features/fits/workspace-page';

/** /pairs/:id */
export function Component() {
  const { id = '' } = useParams();
  return <WorkspacePage key={id} id={id} />;
}
