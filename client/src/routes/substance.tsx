import { useParams } from 'react-router-dom';
import { SubstancePage } from '../features/substances/substance-page';

/** /substances/:id */
export function Component() {
  const { id = '' } = useParams();
  return <SubstancePage id={id} />;
}
