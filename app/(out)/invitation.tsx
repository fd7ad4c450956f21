export { InvitationPage as default } from '@/components/members/invitation-page';
