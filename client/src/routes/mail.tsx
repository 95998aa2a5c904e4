/** /mail */
export { MailPage as Component } from '../features/admin/mail-page';
