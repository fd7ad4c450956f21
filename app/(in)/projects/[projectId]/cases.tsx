export { CasesScreen as default } from '@/components/navigation/loop-screens';
