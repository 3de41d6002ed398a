import { CircleAlert } from 'lucide-react';

export function FieldError({ id, message }: { id: string; message: string | undefined }) {
  if (!message) return null;
  return (
    <p id={id} className="mt-1 flex items-start gap-1.5 text-small font-medium text-hold">
      <CircleAlert size={16} className="mt-px shrink-0" aria-hidden="true" />
      <span>{message}</span>
    </p>
  );
}
