/** /reset-password */
export { ForgottenPasswordPage as Component } from '../features/account/password-pages';
