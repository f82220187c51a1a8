export { CaughtMailPage as Component } from '../features/mail/components/caught-mail-page.tsx';
