export { ActivityScreen as default } from '@/components/activity/activity-screen';
