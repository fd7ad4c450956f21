import { LoopError } from '@/analysis/loop/loop-error';

const refused = (detail: string) => new LoopError({ pointer: '/plant/text', detail, code: 'formula' });

/**
 * Says which round bracket has no partner: a parser only says where it gave up, which for an open one is the end of the text.
 * @throws LoopError at /plant/text, naming the outermost open bracket, or the first that closes nothing
 */
export const refuseBrackets = (text: string): void => {
  const open: number[] = [];
  for (const { 0: bracket, index } of text.matchAll(/[()]/g)) {
    if (bracket === '(') open.push(index);
    else if (open.pop() === undefined)
      throw refused(`The bracket at character ${index + 1} closes nothing. Open one before it, or take it out.`);
  }
  if (open.length > 0) throw refused(`A bracket is open at character ${open[0] + 1}. Close it, or take it out.`);
};
