export { PlantScreen as default } from '@/components/plants/plant-screen';
