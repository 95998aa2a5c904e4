/** /people */
export { PeoplePage as Component } from '../features/admin/people-page';
