export { ResetPasswordPage as Component } from '../features/entry/components/reset-password-page.tsx';
