import { TextBox, type TextBoxProps } from '../../components/form/TextBox.tsx';
import { useEntryField } from './EntryForm.tsx';

export interface EntryFieldProps extends Omit<TextBoxProps, 'name' | 'state'> {
  name: string;
}

export function EntryField(props: EntryFieldProps) {
  const state = useEntryField(props.name, props.hint !== undefined);
  return <TextBox {...props} state={state} />;
}

/** The address that somebody signs in with. */
export const EmailField = ({ hint }: Pick<EntryFieldProps, 'hint'>) => (
  <EntryField
    name="email"
    label="E-mail"
    type="email"
    autoComplete="username"
    autoCapitalize="none"
    spellCheck={false}
    hint={hint}
  />
);
