import { SeriesListPage } from '../features/series/series-list-page';

/** /series */
export const Component = () => <SeriesListPage />;
