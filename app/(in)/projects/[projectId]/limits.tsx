export { LimitsScreen as default } from '@/components/navigation/loop-screens';
