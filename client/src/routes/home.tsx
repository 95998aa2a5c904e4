/** /home */
export { HomePage as Component } from '../features/home/home-page';
