import { Slot } from 'expo-router';
import { SignedInGate } from '@/components/navigation/signed-in-gate';
import { useFetchAhead } from '@/hooks/use-fetch-ahead';

const pages = [() => import('./index'), () => import('./account'), () => import('./projects/[projectId]/_layout')];

export default function SignedInLayout() {
  useFetchAhead(pages);
  return (
    <SignedInGate>
      <Slot />
    </SignedInGate>
  );
}
