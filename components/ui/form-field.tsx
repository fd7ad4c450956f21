import { type Control, type FieldPath, type FieldValues, useController } from 'react-hook-form';
import { Field, type FieldProps } from './field';

export interface FormFieldProps<Values extends FieldValues> extends Omit<FieldProps, 'value' | 'onChangeText' | 'error'> {
  control: Control<Values>;
  name: FieldPath<Values>;
}

/** A field tied to its form: it shows the form's value and what the form's schema says against it. */
export function FormField<Values extends FieldValues>({ control, name, ...rest }: FormFieldProps<Values>) {
  const { field, fieldState } = useController({ control, name });
  return (
    <Field {...rest} value={field.value ?? ''} onChangeText={field.onChange} onBlur={field.onBlur} error={fieldState.error?.message} />
  );
}
