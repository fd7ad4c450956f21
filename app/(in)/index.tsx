export { ProjectList as default } from '@/components/projects/project-list';
