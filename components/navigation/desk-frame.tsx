import type { Href } from 'expo-router';
import type { PropsWithChildren, ReactNode } from 'react';
import { View } from 'react-native';
import { useTheme } from '@/components/ui/theme';
import { line } from '@/components/ui/tokens';
import { useLayout } from '@/components/ui/use-layout';
import { MainArea } from './main-area';
import { PhoneTop } from './phone-top';
import { SignalBanner } from './signal-banner';
import { TopBar } from './top-bar';

export interface DeskFrameProps {
  title: string;
  sub?: string;
  up?: Href;
  /** What stands at the right of the phone's bar. */
  phoneActions?: ReactNode;
}

/** What stands round a page that belongs to no project. */
export function DeskFrame({ title, sub, up, phoneActions, children }: PropsWithChildren<DeskFrameProps>) {
  const { colors } = useTheme();
  const phone = useLayout() === 'phone';
  return (
    <View style={{ flex: 1, minHeight: 0 }}>
      {phone ? (
        <View style={{ borderBottomWidth: line.head, borderBottomColor: colors.ink }}>
          <PhoneTop title={title} sub={sub} up={up}>
            {phoneActions}
          </PhoneTop>
        </View>
      ) : (
        <TopBar />
      )}
      <SignalBanner />
      <MainArea>{children}</MainArea>
    </View>
  );
}
