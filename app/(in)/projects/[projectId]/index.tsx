export { HomeScreen as default } from '@/components/home/home-screen';
