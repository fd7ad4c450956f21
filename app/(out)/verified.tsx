export { Verified as default } from '@/components/account/verified';
