export { MembersScreen as default } from '@/components/members/members-screen';
