export { ForgotPassword as default } from '@/components/account/forgot-password';
