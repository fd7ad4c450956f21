export { PlantScreen as default } from '@/components/navigation/loop-screens';
