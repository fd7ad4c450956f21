export { SignUp as default } from '@/components/account/sign-up';
