import { describe, expect, it } from 'vitest';
import { commandOf, isTyping, keyList } from '@/components/bench/bench-keys';

const key = (name: string, held: Partial<KeyboardEvent> = {}) => ({
  key: name,
  ctrlKey: false,
  metaKey: false,
  altKey: false,
  shiftKey: false,
  ...held,
});

describe('a key of the bench', () => {
  it('chooses a chart, moves a gain, takes back or keeps', () => {
    expect(commandOf(key('n'), true)).toEqual({ kind: 'chart', sheet: 'nyquist' });
    expect(commandOf(key('T'), true)).toEqual({ kind: 'chart', sheet: 'step' });
    expect(commandOf(key('['), true)).toEqual({ kind: 'nudge', fraction: -0.01 });
    expect(commandOf(key('u'), true)).toEqual({ kind: 'undo' });
    expect(commandOf(key('k'), true)).toEqual({ kind: 'keep' });
    expect(commandOf(key('x'), true)).toBeNull();
  });

  it('means nothing once single keys are switched off, except with Ctrl or Cmd', () => {
    expect(commandOf(key('k'), false)).toBeNull();
    expect(commandOf(key('z', { ctrlKey: true }), false)).toEqual({ kind: 'undo' });
    expect(commandOf(key('z', { metaKey: true, shiftKey: true }), false)).toEqual({ kind: 'redo' });
  });

  it('never takes a combination away from the browser', () => {
    expect(commandOf(key('n', { ctrlKey: true }), true)).toBeNull();
    expect(commandOf(key('s', { metaKey: true }), true)).toBeNull();
    expect(commandOf(key('b', { altKey: true }), true)).toBeNull();
  });

  it('is typing where a field has it', () => {
    document.body.innerHTML = '<div><input id="field"><button id="plain"></button></div>';
    expect(isTyping(document.getElementById('field'))).toBe(true);
    expect(isTyping(document.getElementById('plain'))).toBe(false);
  });

  it('is listed with what it does', () => {
    const listed = keyList.map(({ keys }) => keys).join(' ');
    for (const name of ['B', 'N', 'S', 'T', 'L', '[', ']', 'U', 'K']) expect(listed).toContain(name);
  });
});
