import type { FormEvent, PropsWithChildren } from 'react';
import { View } from 'react-native';
import { ProblemLine } from './problem-line';

export interface FormProps {
  /** What is done when Enter is pressed in a field or the button with `type="submit"` semantics is used. */
  onSubmit: () => void;
  /** What the server had against it as a whole. */
  problem?: string | null;
  gap?: number;
}

/** A real form element, so that Enter submits and password managers know what they see. */
export function Form({ onSubmit, problem, gap = 16, children }: PropsWithChildren<FormProps>) {
  const submit = (event: FormEvent) => {
    event.preventDefault();
    onSubmit();
  };
  return (
    <form onSubmit={submit} noValidate>
      <View style={{ gap }}>
        {children}
        <ProblemLine text={problem} />
      </View>
      <button type="submit" hidden tabIndex={-1} aria-hidden />
    </form>
  );
}
