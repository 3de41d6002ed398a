import { useFormContext } from 'react-hook-form';
import { PasswordBox, type PasswordBoxProps } from '../../components/form/PasswordBox.tsx';
import { useField } from '../../components/form/useField.ts';

export interface SecretFieldProps extends Omit<PasswordBoxProps, 'name' | 'state'> {
  name: string;
}

/** A password in a form of the signed-in pages. */
export function SecretField({ name, ...rest }: SecretFieldProps) {
  const { register } = useFormContext();
  const state = useField(name, rest.hint !== undefined);
  return <PasswordBox {...rest} state={state} {...register(name)} />;
}
