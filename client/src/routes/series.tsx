import { useParams } from 'react-router-dom';
import { SeriesPage } from '../features/series/series-page';

/** /series/:id */
export function Component() {
  const { id = '' } = useParams();
  return <SeriesPage key={id} id={id} />;
}
