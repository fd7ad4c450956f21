import { describe, expect, it } from 'vitest';
import { initials } from '@/components/navigation/initials';
import { pageAt } from '@/components/navigation/pages';
import { safeNext, signInPath } from '@/components/navigation/routes';

describe('signing in leads back', () => {
  it('to the page asked for', () => {
    expect(signInPath('/projects/1/bench?case=2')).toBe('/sign-in?next=%2Fprojects%2F1%2Fbench%3Fcase%3D2');
    expect(safeNext('/projects/1/bench')).toBe('/projects/1/bench');
  });

  it.each(['https://elsewhere.example', '//elsewhere.example', '/\\elsewhere.example', 'javascript:alert(1)', undefined])(
    'never to %s',
    (next) => {
      expect(safeNext(next)).toBe('/');
    },
  );
});

describe('where one is', () => {
  it.each([
    ['/projects/1', 'home'],
    ['/projects/1/plant', 'plant'],
    ['/projects/1/analyses/2', 'analyses'],
    ['/projects/1/limits', 'limits'],
  ])('%s is %s', (path, page) => {
    expect(pageAt(path).page).toBe(page);
  });

  it.each([
    ['Mira Castellan', 'MC'],
    ['Tove', 'T'],
    ['Anna de la Cruz', 'AC'],
    ['  ', '–'],
  ])('%s is %s in the circle', (name, letters) => {
    expect(initials(name)).toBe(letters);
  });
});
