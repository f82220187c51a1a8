export { SignInPage as Component } from '../features/entry/components/sign-in-page.tsx';
