import { useParams } from 'react-router-dom';
import { EditSeriesPage } from '../features/series/edit-series-page';

/** /series/:id/edit */
export function Component() {
  const { id = '' } = useParams();
  return <EditSeriesPage key={id} id={id} />;
}
