export { AcceptInvitationPage as Component } from '../features/entry/components/accept-invitation-page.tsx';
