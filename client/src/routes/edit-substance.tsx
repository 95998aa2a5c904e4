import { useParams } from 'react-router-dom';
import { EditSubstancePage } from '../features/substances/substance-edit-pages';

/** /substances/:id/edit */
export function Component() {
  const { id = '' } = useParams();
  return <EditSubstancePage id={id} />;
}
