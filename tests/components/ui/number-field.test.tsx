import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { afterEach, describe, expect, it } from 'vitest';
import { NumberField } from '@/components/ui/number-field';
import { parseNumber } from '@/components/ui/parse-number';

afterEach(cleanup);

function Subject() {
  const [value, setValue] = useState(0.08);
  return (
    <>
      <NumberField
        label="Dead time"
        unit="s"
        value={value}
        onChangeNumber={setValue}
        refuse={(x) => (x < 0 ? 'Dead time is 0 or more.' : null)}
      />
      <output data-testid="value">{value}</output>
    </>
  );
}

describe('a number field', () => {
  it('takes a decimal comma and a real minus', () => {
    expect(parseNumber('0,35')).toBe(0.35);
    expect(parseNumber(' −2 ')).toBe(-2);
    expect(parseNumber('1e400')).toBeNull();
    expect(parseNumber('')).toBeNull();
  });

  it('hands on what is a number, and keeps what was typed', () => {
    render(<Subject />);
    const field = screen.getByLabelText<HTMLInputElement>('Dead time');
    fireEvent.change(field, { target: { value: '0,1' } });
    expect(screen.getByTestId('value').textContent).toBe('0.1');
    expect(field.value).toBe('0,1');
  });

  it('says what is wrong and keeps the last good value', () => {
    render(<Subject />);
    const field = screen.getByLabelText<HTMLInputElement>('Dead time');
    fireEvent.change(field, { target: { value: '-1' } });
    expect(screen.getByText('Dead time is 0 or more.')).toBeTruthy();
    expect(field.getAttribute('aria-invalid')).toBe('true');
    expect(field.value).toBe('-1');
    expect(screen.getByTestId('value').textContent).toBe('0.08');
  });
});
