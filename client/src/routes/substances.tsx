import { useSearchParams } from 'react-router-dom';
import { SubstanceListPage } from '../features/substances/substance-list-page';

/** /substances */
export function Component() {
  const [search] = useSearchParams();
  return <SubstanceListPage search={search.get('search') ?? ''} />;
}
