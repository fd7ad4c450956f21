import { useEffect, useState } from 'react';
import type { WayName } from '@/analysis/project';
import type { Room, RoomWay } from '@/contract';
import { useBench } from '../bench-context';
import { contentWith, type Settings } from '../draft/settings';
import { engines } from '../engine/engines';
import { useRestedOverCases } from './use-rested-over-cases';

const ways: readonly WayName[] = ['moreGain', 'lessGain', 'moreDeadTime'];

interface Found {
  readonly settings: Settings;
  readonly room: Room;
}

/** The room that the gains on the bench leave, looked for at rest; null where nothing is demanded. */
export function useRoom(): Room | 'sought' | null {
  const { conditions, opened } = useBench().subject;
  const rested = useRestedOverCases();
  const [found, setFound] = useState<Found | null>(null);
  useEffect(() => {
    if (rested === null || conditions.limits.length === 0) return;
    const { settings, answer } = rested;
    let left = false;
    const look = async () => {
      const room: Partial<Record<WayName, RoomWay>> = {};
      for (const way of ways) {
        if (left) return;
        const question = { way, design: contentWith(opened, settings), conditions, results: answer.results };
        room[way] = await engines().search.run('lookAlong', question);
      }
      if (!left) setFound({ settings, room: room as Room });
    };
    void look();
    return () => {
      left = true;
    };
  }, [rested, conditions, opened]);
  if (conditions.limits.length === 0) return null;
  return found !== null && found.settings === rested?.settings ? found.room : 'sought';
}
