export { ForgotPasswordPage as Component } from '../features/entry/components/forgot-password-page.tsx';
