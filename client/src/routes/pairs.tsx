import { PairsPage } from '../features/pairs/pairs-page';

/** /pairs */
export const Component = () => <PairsPage />;
