export { NotFound as default } from '@/components/navigation/not-found';
