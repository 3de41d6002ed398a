import { PasswordBox, type PasswordBoxProps } from '../../components/form/PasswordBox.tsx';
import { useEntryField } from './EntryForm.tsx';

export interface PasswordFieldProps extends Omit<PasswordBoxProps, 'name' | 'state'> {
  name: string;
}

export function PasswordField(props: PasswordFieldProps) {
  const state = useEntryField(props.name, props.hint !== undefined);
  return <PasswordBox {...props} state={state} />;
}
