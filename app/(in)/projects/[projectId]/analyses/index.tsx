export { AnalysisList as default } from '@/components/analyses/analysis-list';
