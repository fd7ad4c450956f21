import { useLocalSearchParams } from 'expo-router';
import { Banner } from '@/components/ui/banner';
import { Link } from '@/components/ui/link';
import { EntryFrame } from './entry-frame';

/** Where the link of a verification mail ends up; the server has looked at its token before. */
export function Verified() {
  const { error } = useLocalSearchParams<{ error?: string }>();
  return (
    <EntryFrame title="Address" lead={error ? 'This link has ended, or was used before.' : 'Your address is verified.'}>
      {error ? (
        <Banner lead="Nothing was changed." text="Account sends a new link to your address." />
      ) : (
        <Banner lead="Done." text="Others can now invite you to their projects." />
      )}
      <Link href={error ? '/account' : '/'}>{error ? 'Account' : 'All projects'}</Link>
    </EntryFrame>
  );
}
