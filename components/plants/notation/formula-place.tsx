import { Text } from '@/components/ui/text';

const AROUND = 14;

/** Where a refusal points, counted from 0; null where it names no character. */
export function placeOf(problem: string): number | null {
  const found = /character (\d+)/i.exec(problem);
  return found && Number(found[1]) - 1;
}

/** The formula round the character that a refusal names, with that one marked. */
export function FormulaPlace({ text, problem }: { text: string; problem: string }) {
  const place = placeOf(problem);
  if (place === null || place >= text.length) return null;
  const start = Math.max(0, place - AROUND);
  const end = place + 1 + AROUND;
  return (
    <Text step="h3" tone="ink2" aria-hidden numberOfLines={1}>
      {start > 0 ? '…' : ''}
      {text.slice(start, place)}
      <Text step="h3" tone="fail" weight={700} style={{ textDecorationLine: 'underline' }}>
        {text[place]}
      </Text>
      {text.slice(place + 1, end)}
      {end < text.length ? '…' : ''}
    </Text>
  );
}
