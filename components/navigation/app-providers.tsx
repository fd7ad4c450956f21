import { QueryClientProvider, useQuery } from '@tanstack/react-query';
import { type PropsWithChildren, useEffect, useState } from 'react';
import { SafeAreaProvider } from 'react-native-safe-area-context';
import { AnnouncementsProvider } from '@/components/ui/announcements';
import { useAppFonts } from '@/components/ui/use-app-fonts';
import { ThemeProvider } from '@/components/ui/theme';
import { UnitsProvider } from '@/components/ui/units';
import { defaultPreferences } from '@/hooks/default-preferences';
import { createQueryClient } from '@/hooks/api/query-client';
import { meQuery } from '@/hooks/queries/me';
import { recallTheme, rememberTheme } from '@/hooks/recall-theme';

/** What every page stands in: the cache of answers, the fonts, and how its reader wants it to look and count. */
export function AppProviders({ children }: PropsWithChildren) {
  const [client] = useState(createQueryClient);
  useAppFonts();
  return (
    <QueryClientProvider client={client}>
      <ReaderProviders>
        <SafeAreaProvider>{children}</SafeAreaProvider>
      </ReaderProviders>
    </QueryClientProvider>
  );
}

function ReaderProviders({ children }: PropsWithChildren) {
  const { data: me } = useQuery(meQuery);
  const preferences = me?.preferences ?? { ...defaultPreferences, theme: recallTheme() };
  const theme = me?.preferences.theme;
  useEffect(() => {
    if (theme) rememberTheme(theme);
  }, [theme]);
  return (
    <ThemeProvider preference={preferences.theme}>
      <UnitsProvider preferences={preferences}>
        <AnnouncementsProvider>{children}</AnnouncementsProvider>
      </UnitsProvider>
    </ThemeProvider>
  );
}
