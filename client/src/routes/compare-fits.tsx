import { useSearchParams } from 'react-router-dom';
import { ComparePage } from '../features/fits/compare-page';

/** /fits/compare?fits=… */
export function Component() {
  const [search] = useSearchParams();
  const fits = search.get('fits') ?? '';
  return <ComparePage key={fits} ids={fits.split(',').filter(Boolean)} />;
}
