import { useFormContext, type FieldErrors } from 'react-hook-form';
import { Notice } from '../ui/Notice.tsx';

/** Beside the button that was pressed: how many fields want another look, with the first reason. */
export function ErrorSummary() {
  const { formState } = useFormContext();
  const messages = messagesOf(formState.errors);
  if (formState.submitCount === 0 || messages.length === 0) return null;
  const [first] = messages;
  return (
    <Notice kind="hold" alert>
      {messages.length === 1
        ? `One field wants another look: ${first}.`
        : `${messages.length} fields want another look; the first: ${first}.`}
    </Notice>
  );
}

function messagesOf(errors: FieldErrors | unknown): string[] {
  if (typeof errors !== 'object' || errors === null) return [];
  if ('message' in errors && typeof errors.message === 'string')
    return [errors.message.replace(/\.$/, '')];
  return Object.entries(errors).flatMap(([key, value]) => (key === 'ref' ? [] : messagesOf(value)));
}
