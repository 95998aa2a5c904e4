/** /api-guide */
export { ApiGuidePage as Component } from '../features/api-guide/api-guide-page';
