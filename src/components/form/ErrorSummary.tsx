import { Notice } from '../ui/Notice.tsx';

/** Beside the button that was pressed: how many fields want another look, with the first reason. */
export function ErrorSummary({ messages }: { messages: readonly string[] }) {
  const first = messages[0]?.replace(/\.$/, '');
  if (first === undefined) return null;
  return (
    <Notice kind="hold" alert>
      {messages.length === 1
        ? `One field wants another look: ${first}.`
        : `${messages.length} fields want another look; the first: ${first}.`}
    </Notice>
  );
}
