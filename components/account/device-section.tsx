import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog, DialogDecision } from '@/components/ui/dialog';
import { Heading, Text } from '@/components/ui/text';
import { draftCount, forgetDrafts } from '@/hooks/device-store';
import { SettingRow } from './setting-row';

/** What stays on this device when the page is closed, and the way to take it off. */
export function DeviceSection() {
  const [drafts, setDrafts] = useState(draftCount);
  const [asking, setAsking] = useState(false);
  const forget = () => {
    forgetDrafts();
    setDrafts(draftCount());
    setAsking(false);
  };
  const count = drafts === 1 ? '1 draft not kept' : `${drafts} drafts not kept`;
  return (
    <>
      <Heading level={2}>Kept on this device</Heading>
      <SettingRow name={drafts === 0 ? 'No drafts' : count} about="A draft stays here until you keep it. The theme stays too.">
        {drafts > 0 ? <Button label="Throw away" onPress={() => setAsking(true)} /> : null}
      </SettingRow>
      <Dialog open={asking} title={`Throw away ${count.replace(' not kept', '')}?`} onClose={() => setAsking(false)}>
        <Text tone="ink2">What was typed and never kept is gone from this device afterwards.</Text>
        <DialogDecision label="Throw away" onDecide={forget} onClose={() => setAsking(false)} />
      </Dialog>
    </>
  );
}
