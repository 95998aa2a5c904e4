import { useParams } from 'react-router-dom';
import { FitPage } from '../features/fits/fit-page';

/** /fits/:id */
export function Component() {
  const { id = '' } = useParams();
  return <FitPage key={id} id={id} />;
}
