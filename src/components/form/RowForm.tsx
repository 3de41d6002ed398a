import { useEffect, type ReactNode } from 'react';
import { useForm, type DefaultValues, type FieldValues, type UseFormReturn } from 'react-hook-form';
import type { z } from 'zod';
import { ChangedElsewhere, DeletedElsewhere } from './ChangedElsewhere.tsx';
import { ConflictPanel } from './ConflictPanel.tsx';
import { contractResolver } from './contractResolver.ts';
import { Form } from './Form.tsx';
import { changesFrom } from './rowEdit.ts';
import { useRowEdit } from './useRowEdit.ts';

interface Row {
  id: string;
  version: number;
}

export interface RowFormProps<R extends Row, C extends FieldValues & { id: string }> {
  /** Null: a new row. */
  row: R | null;
  rowSchema: z.ZodType<R>;
  /** What is needed to make one; an edit is held to the same. */
  contract: z.ZodType<C>;
  /** The contract has a `typed` record for its number fields. */
  keepsTyped: boolean;
  /** What the fields show at first, with the row's id or a new one. */
  values: FieldValues & { id: string };
  /** Turns what the fields hold into what the contract wants, where the two differ. */
  shape?: (body: Record<string, unknown>) => Record<string, unknown>;
  create: (body: C) => Promise<unknown>;
  patch: (change: {
    id: string;
    version: number;
    patch: Partial<Omit<C, 'id'>>;
  }) => Promise<unknown>;
  labelOf: (key: string) => string;
  wordsOf: (key: string, facts: Partial<Omit<C, 'id'>>) => string;
  onDone: (id: string) => void;
  onCancel?: () => void;
  action: string;
  /** A form that stays on its page shows what others save for as long as nothing is written in it. */
  follows?: boolean;
  /** Somebody deleted the row while it was open. */
  isGone?: boolean;
  aside?: ReactNode;
  children: ReactNode;
}

/** A form that makes a row or edits one, with the way out of a conflict. */
export function RowForm<R extends Row, C extends FieldValues & { id: string }>(
  props: RowFormProps<R, C>,
) {
  return props.row ? <EditRow {...props} row={props.row} /> : <CreateRow {...props} />;
}

function useContractForm<R extends Row, C extends FieldValues & { id: string }>(
  props: RowFormProps<R, C>,
) {
  return useForm<FieldValues, unknown, C>({
    resolver: contractResolver<FieldValues, C>(props.contract, {
      typed: props.keepsTyped,
      shape: props.shape,
    }),
    defaultValues: props.values as DefaultValues<FieldValues>,
  });
}

function CreateRow<R extends Row, C extends FieldValues & { id: string }>(
  props: RowFormProps<R, C>,
) {
  const form = useContractForm(props);
  return (
    <Form
      form={form}
      action={props.action}
      {...(props.onCancel && { onCancel: props.onCancel })}
      onSubmit={async (body) => {
        await props.create(body);
        props.onDone(body.id);
      }}
    >
      {props.children}
    </Form>
  );
}

function EditRow<R extends Row, C extends FieldValues & { id: string }>(
  props: RowFormProps<R, C> & { row: R },
) {
  type Facts = Omit<C, 'id'>;
  const { row } = props;
  const form = useContractForm(props);
  const edit = useRowEdit<R, Facts>({
    row,
    schema: props.rowSchema,
    factsOf: (from) => factsLike(form.getValues(), from),
    save: (version, patch) => props.patch({ id: row.id, version, patch }),
    onDone: () => props.onDone(row.id),
  });
  useFollowRow(props, form, edit);
  if (edit.conflict)
    return (
      <ConflictPanel<Facts>
        conflict={edit.conflict}
        labelOf={(key) => props.labelOf(String(key))}
        wordsOf={(key, facts) => props.wordsOf(String(key), facts)}
        onResolve={edit.resolve}
        onBack={edit.backToForm}
      />
    );
  return (
    <Form
      form={form}
      action={props.action}
      aside={props.aside}
      {...(props.onCancel && { onCancel: props.onCancel })}
      onSubmit={({ id: _id, ...facts }) => edit.submit(facts)}
    >
      {props.isGone ? (
        <DeletedElsewhere row={row} />
      ) : (
        <ChangedElsewhere row={row} labels={changedLabels(props, form, edit.base)} />
      )}
      {props.children}
    </Form>
  );
}

/** As long as nothing is written, the fields show the row as it is. */
function useFollowRow<R extends Row, C extends FieldValues & { id: string }>(
  { row, follows = false, values }: RowFormProps<R, C> & { row: R },
  { formState, reset }: UseFormReturn<FieldValues, unknown, C>,
  { base, rebase }: { base: R; rebase: (row: R) => void },
) {
  const { isDirty } = formState;
  const isBehind = follows && !isDirty && row.version !== base.version;
  useEffect(() => {
    if (!isBehind) return;
    rebase(row);
    reset(values as DefaultValues<FieldValues>);
  }, [isBehind, rebase, reset, row, values]);
}

/** Names of the form's fields that are no longer as they were when it was opened. */
function changedLabels<R extends Row, C extends FieldValues & { id: string }>(
  { row, labelOf }: RowFormProps<R, C> & { row: R },
  form: UseFormReturn<FieldValues, unknown, C>,
  base: R,
): string[] {
  if (row.version === base.version) return [];
  const [was, is] = [base, row].map((one) => factsLike<object>(form.getValues(), one));
  return Object.keys(changesFrom(was ?? {}, is ?? {}))
    .filter((key) => key !== 'typed')
    .map(labelOf);
}

/** The part of a row that the form edits. */
function factsLike<Facts>(values: FieldValues, row: object): Facts {
  const keys = new Set([...Object.keys(values), 'typed']);
  keys.delete('id');
  return Object.fromEntries(Object.entries(row).filter(([key]) => keys.has(key))) as Facts;
}
