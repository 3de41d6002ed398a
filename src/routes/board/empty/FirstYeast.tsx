import { useId, useState } from 'react';
import { name as nameField } from '#shared/api/fields.ts';
import { YEAST_KINDS, type YeastKind } from '#shared/rules/vocabulary.ts';
import { FieldError } from '../../../components/form/FieldError.tsx';
import { fieldClass } from '../../../components/form/fieldClass.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { useFirstShelf } from './useFirstShelf.ts';

const KIND_WORDS: Record<YeastKind, string> = { ale: 'Ale yeast', lager: 'Lager yeast' };

/** One line that makes the first yeast and its shelf. */
export function FirstYeast() {
  const id = useId();
  const [name, setName] = useState('');
  const [kind, setKind] = useState<YeastKind>('ale');
  const [why, setWhy] = useState<string>();
  const shelf = useFirstShelf();
  const submit = () => {
    const parsed = nameField.safeParse(name);
    setWhy(parsed.error?.issues[0]?.message);
    if (parsed.success) shelf.mutate({ name: parsed.data, kind });
  };
  return (
    <form
      className="mt-3.5"
      onSubmit={(event) => {
        event.preventDefault();
        submit();
      }}
    >
      <label htmlFor={id} className="sr-only">
        Strain
      </label>
      <div className="flex flex-wrap gap-2">
        <input
          id={id}
          value={name}
          maxLength={80}
          placeholder="Strain, such as Harbour ale"
          onChange={(event) => setName(event.target.value)}
          aria-invalid={why !== undefined}
          aria-describedby={`${id}-why`}
          className={fieldClass(why !== undefined, 'flex-1 basis-48')}
        />
        <Button type="submit" look="first" className="min-h-11" disabled={shelf.isPending}>
          Put on shelf
        </Button>
      </div>
      <FieldError id={`${id}-why`} message={why} />
      <KindChoice kind={kind} onChange={setKind} />
      {shelf.error && (
        <Notice kind="hold" alert className="mt-2">
          {sentenceOf(shelf.error)}
        </Notice>
      )}
    </form>
  );
}

function KindChoice({ kind, onChange }: { kind: YeastKind; onChange: (kind: YeastKind) => void }) {
  const group = useId();
  return (
    <fieldset className="mt-2.5 flex flex-wrap gap-x-5 gap-y-1 text-ink">
      <legend className="sr-only">Kind of yeast</legend>
      {YEAST_KINDS.map((value) => (
        <label key={value} className="flex min-h-9 items-center gap-2 max-tablet:min-h-11">
          <input
            type="radio"
            name={group}
            checked={kind === value}
            onChange={() => onChange(value)}
            className="size-5 accent-bottle"
          />
          {KIND_WORDS[value]}
        </label>
      ))}
    </fieldset>
  );
}
