export { SignIn as default } from '@/components/account/sign-in';
