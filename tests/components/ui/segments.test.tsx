import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { afterEach, describe, expect, it } from 'vitest';
import { Segments } from '@/components/ui/segments';

const options = [
  { value: 'rad/s', label: 'rad/s' },
  { value: 'Hz', label: 'Hz' },
] as const;

afterEach(cleanup);

function Subject() {
  const [value, setValue] = useState<'rad/s' | 'Hz'>('rad/s');
  return <Segments label="Frequency" value={value} options={options} onChange={setValue} />;
}

const checked = () => screen.getAllByRole('radio').filter((radio) => radio.getAttribute('aria-checked') === 'true');

describe('segments', () => {
  it('are one stop for Tab', () => {
    render(<Subject />);
    expect(screen.getAllByRole('radio').map((radio) => radio.tabIndex)).toEqual([0, -1]);
  });

  it('change with the arrow keys, round the end', () => {
    render(<Subject />);
    fireEvent.keyDown(screen.getByRole('radiogroup'), { key: 'ArrowRight' });
    expect(checked().map((radio) => radio.textContent)).toEqual(['Hz']);
    fireEvent.keyDown(screen.getByRole('radiogroup'), { key: 'ArrowRight' });
    expect(checked().map((radio) => radio.textContent)).toEqual(['rad/s']);
  });
});
