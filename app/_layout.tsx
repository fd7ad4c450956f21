import { Slot } from 'expo-router';
import { AppProviders } from '@/components/navigation/app-providers';
import { PageBoundary } from '@/components/navigation/page-boundary';

export default function RootLayout() {
  return (
    <AppProviders>
      <PageBoundary>
        <Slot />
      </PageBoundary>
    </AppProviders>
  );
}
