import { reachOf, room, roomWay, wayNames, type RoomQuestion, type WayName } from '@/analysis/project';
import type { Room } from '@/contract';
import { inTurn, type Watch } from '../jobs/in-turn';
import type { LoopPool } from '../jobs/loop-pool';

/** Below this, a second thread would spend longer finding its own first break than it saves. */
const WORTH_SPLITTING = 48;

interface Part {
  readonly way: WayName;
  readonly question: RoomQuestion;
}

const everyNth = <Item>(items: readonly Item[], n: number, first: number) => items.filter((_, index) => index % n === first);

/** The cases in parts that have bad and good ones alike. */
function parts(question: RoomQuestion, threads: number): RoomQuestion[] {
  const count = question.cases.length < WORTH_SPLITTING ? 1 : threads;
  return Array.from({ length: count }, (_, first) => ({
    ...question,
    cases: everyNth(question.cases, count, first),
    results: everyNth(question.results, count, first),
  }));
}

/** How much room a judged design leaves, worked out on all threads. @see room of analysis/project */
export async function computeRoom(jobs: LoopPool, question: RoomQuestion, watch: Watch = {}): Promise<Room> {
  // Without limits nothing is asked of the engine: stability ends where the margins say.
  if (question.limits.length === 0) return room(question);
  const split = parts(question, jobs.threads);
  const tasks = wayNames.flatMap((way) => split.map((part): Part => ({ way, question: part })));
  const found = await inTurn(
    tasks,
    async ({ way, question: part }) => {
      const first = await jobs.room(way, part, reachOf(way, question.results));
      watch.done?.(part.cases.length);
      return { way, first };
    },
    { ...watch, atOnce: jobs.threads },
  );
  const along = (way: WayName) =>
    roomWay(
      way,
      question.results,
      found.filter((one) => one.way === way).map(({ first }) => first),
    );
  return { moreGain: along('moreGain'), lessGain: along('lessGain'), moreDeadTime: along('moreDeadTime') };
}
