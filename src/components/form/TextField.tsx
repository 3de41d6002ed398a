import { useFormContext } from 'react-hook-form';
import { TextBox, type TextBoxProps } from './TextBox.tsx';
import { useField } from './useField.ts';

export interface TextFieldProps extends Omit<TextBoxProps, 'name' | 'state'> {
  name: string;
}

export function TextField({ name, ...rest }: TextFieldProps) {
  const { register } = useFormContext();
  const state = useField(name, rest.hint !== undefined);
  return <TextBox {...rest} state={state} {...register(name)} />;
}
