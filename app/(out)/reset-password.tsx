export { ResetPassword as default } from '@/components/account/reset-password';
