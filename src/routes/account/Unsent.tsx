import { useEffect } from 'react';
import { Notice } from '../../components/ui/Notice.tsx';
import { outbox } from '../../outbox/outbox.ts';
import { useOutbox } from '../../outbox/useOutbox.ts';

/** What waits on this device is written under one's name, and cannot be sent without it. */
export function Unsent() {
  const waiting = useOutbox().length;
  useEffect(() => void outbox.look(), []);
  if (waiting === 0) return null;
  return (
    <Notice kind="mind">
      {waiting === 1 ? 'One entry has' : `${waiting} entries have`} not been sent yet, and{' '}
      {waiting === 1 ? 'is' : 'are'} lost with the account. Wait until nothing is waiting before you
      close it.
    </Notice>
  );
}
