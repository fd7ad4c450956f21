export { BenchScreen as default } from '@/components/navigation/loop-screens';
