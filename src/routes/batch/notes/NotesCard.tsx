import { useState } from 'react';
import { useForm } from 'react-hook-form';
import type { Batch } from '#shared/api/batch.ts';
import { noteCreate, type BatchNote, type NoteCreate } from '#shared/api/reading.ts';
import { useNotes } from '../../../api/batchRecord.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { newId } from '../../../app/newId.ts';
import { dayAndTime } from '../../../app/zonedTime.ts';
import { contractResolver } from '../../../components/form/contractResolver.ts';
import { Form } from '../../../components/form/Form.tsx';
import { NoteField } from '../../../components/form/NoteField.tsx';
import { Button } from '../../../components/ui/Button.tsx';
import { Card, CardTitle } from '../../../components/ui/Card.tsx';
import { ConfirmDialog } from '../../../components/ui/ConfirmDialog.tsx';
import { say } from '../../../components/ui/Toast.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';

interface NotesCardProps {
  batch: Batch;
  notes: readonly BatchNote[];
}

/** What was seen, smelt and thought while it fermented, newest first. */
export function NotesCard({ batch, notes }: NotesCardProps) {
  const { mayWriteDown, board } = useBoardView();
  const [edited, setEdited] = useState<string | null>(null);
  const done = () => setEdited(null);
  return (
    <Card>
      <CardTitle>Notes</CardTitle>
      {batch.notes && <p className="mt-2 wrap-anywhere text-ink2">Planned: {batch.notes}</p>}
      {notes.length === 0 && !batch.notes && edited === null && (
        <p className="mt-2 text-ink2">Nothing is written yet.</p>
      )}
      <ul className="mt-2 space-y-3">
        {notes.map((note) =>
          edited === note.id ? (
            <li key={note.id}>
              <NoteForm batch={batch} note={note} onDone={done} />
            </li>
          ) : (
            <Note
              key={note.id}
              batch={batch}
              note={note}
              {...(mayWriteDown &&
                note.by.personId === board.me.personId && { onEdit: () => setEdited(note.id) })}
            />
          ),
        )}
      </ul>
      {mayWriteDown &&
        (edited === 'new' ? (
          <div className="mt-3">
            <NoteForm batch={batch} note={null} onDone={done} />
          </div>
        ) : (
          <Button look="quiet" size="small" className="mt-3" onClick={() => setEdited('new')}>
            Write a note
          </Button>
        ))}
    </Card>
  );
}

interface NoteProps {
  batch: Batch;
  note: BatchNote;
  onEdit?: () => void;
}

function Note({ batch, note, onEdit }: NoteProps) {
  const { board, mayWriteDown } = useBoardView();
  const { timeZone } = board.brewery;
  const [deleting, setDeleting] = useState(false);
  const mayDelete = onEdit !== undefined || (mayWriteDown && board.me.role === 'head-brewer');
  return (
    <li>
      <p className="text-small text-ink2">
        {note.by.name}, {dayAndTime(note.at, timeZone)}
        {note.editedAt && ', changed since'}
      </p>
      <p className="wrap-anywhere whitespace-pre-wrap">{note.text}</p>
      <div className="flex gap-3 text-small">
        {onEdit && (
          <button type="button" className="underline underline-offset-3" onClick={onEdit}>
            Change
          </button>
        )}
        {mayDelete && (
          <button
            type="button"
            className="underline underline-offset-3"
            onClick={() => setDeleting(true)}
          >
            Delete
          </button>
        )}
      </div>
      {deleting && <DeleteNote batch={batch} note={note} onClose={() => setDeleting(false)} />}
    </li>
  );
}

function DeleteNote({ batch, note, onClose }: NoteProps & { onClose: () => void }) {
  const { slug } = useBoardView();
  const { remove } = useNotes(slug, batch.id);
  return (
    <ConfirmDialog
      open
      onClose={onClose}
      title="Delete this note"
      action="Delete"
      busy={remove.isPending}
      // The note goes from the page at once, and this with it: a refusal is told wherever one is then.
      onConfirm={() =>
        void remove.mutateAsync(note).then(onClose, (error: unknown) => say(sentenceOf(error)))
      }
    >
      <p className="line-clamp-3">{note.text}</p>
    </ConfirmDialog>
  );
}

interface NoteFormProps {
  batch: Batch;
  note: BatchNote | null;
  onDone: () => void;
}

function NoteForm({ batch, note, onDone }: NoteFormProps) {
  const { slug } = useBoardView();
  const { add, edit } = useNotes(slug, batch.id);
  const form = useForm({
    defaultValues: { id: note?.id ?? newId(), text: note?.text ?? '' },
    resolver: contractResolver<{ id: string; text: string }, NoteCreate>(noteCreate),
  });
  return (
    <Form
      form={form}
      action="Save the note"
      onCancel={onDone}
      onSubmit={async (body) => {
        if (note) await edit.mutateAsync({ id: note.id, version: note.version, text: body.text });
        else await add.mutateAsync(body);
        onDone();
      }}
    >
      <NoteField name="text" label="Note" />
    </Form>
  );
}
