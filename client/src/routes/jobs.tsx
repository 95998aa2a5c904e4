/** /jobs */
export { JobsPage as Component } from '../features/admin/jobs-page';
