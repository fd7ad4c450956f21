import Head from 'expo-router/head';

/** What the window, a bookmark and a screen reader call this page: the narrowest name first. */
export function DocumentTitle({ parts }: { parts: readonly string[] }) {
  return (
    <Head>
      <title>{[...parts, 'Kerbline'].join(' · ')}</title>
    </Head>
  );
}
