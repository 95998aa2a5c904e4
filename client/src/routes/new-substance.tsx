/** /substances/new */
export { NewSubstancePage as Component } from '../features/substances/substance-edit-pages';
