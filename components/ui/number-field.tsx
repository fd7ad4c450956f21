import { useState } from 'react';
import { Field, type FieldProps } from './field';
import { parseNumber } from './parse-number';

export interface NumberFieldProps extends Omit<FieldProps, 'value' | 'onChangeText' | 'numeric'> {
  value: number;
  format?: (value: number) => string;
  /** Called with every text that is a number. */
  onChangeNumber: (value: number) => void;
  /** Why a number is refused, or null. */
  refuse?: (value: number) => string | null;
}

/** A field for one number that keeps what was typed: it takes its value from outside only when that differs from what its text says. */
export function NumberField({ value, format = String, onChangeNumber, refuse, error, onBlur, ...rest }: NumberFieldProps) {
  const [text, setText] = useState(format(value));
  const typed = parseNumber(text);
  const problem = typed === null ? 'A number, as in 0.35.' : (refuse?.(typed) ?? null);
  const [shown, setShown] = useState(value);
  if (shown !== value) {
    setShown(value);
    if (typed !== value) setText(format(value));
  }
  const type = (next: string) => {
    setText(next);
    const number = parseNumber(next);
    if (number !== null && !refuse?.(number)) onChangeNumber(number);
  };
  return (
    <Field
      {...rest}
      numeric
      inputMode="decimal"
      value={text}
      onChangeText={type}
      onBlur={(event) => {
        if (problem === null) setText(format(value));
        onBlur?.(event);
      }}
      error={problem ?? error}
    />
  );
}
