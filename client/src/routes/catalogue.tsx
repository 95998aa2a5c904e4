import { useSearchParams } from 'react-router-dom';
import { CataloguePage } from '../features/catalogue/catalogue-page';

/** / */
export function Component() {
  const [search] = useSearchParams();
  return <CataloguePage search={search.get('search') ?? ''} />;
}
