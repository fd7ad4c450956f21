import type { FormEvent, PropsWithChildren } from 'react';
import { View } from 'react-native';
import { Text } from './text';
import { useTheme } from './theme';

export interface FormProps {
  /** What is done when Enter is pressed in a field or the button with `type="submit"` semantics is used. */
  onSubmit: () => void;
  /** What the server had against it as a whole. */
  problem?: string | null;
  gap?: number;
}

/** A real form element, so that Enter submits and password managers know what they see. */
export function Form({ onSubmit, problem, gap = 16, children }: PropsWithChildren<FormProps>) {
  const { colors } = useTheme();
  const submit = (event: FormEvent) => {
    event.preventDefault();
    onSubmit();
  };
  return (
    <form onSubmit={submit} noValidate>
      <View style={{ gap }}>
        {children}
        <View role="alert">
          {problem ? (
            <View style={{ borderLeftWidth: 4, borderLeftColor: colors.fail, paddingLeft: 8 }}>
              <Text step="note" tone="fail">
                {problem}
              </Text>
            </View>
          ) : null}
        </View>
      </View>
      <button type="submit" hidden tabIndex={-1} aria-hidden />
    </form>
  );
}
