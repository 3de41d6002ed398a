import type { Batch } from '#shared/api/batch.ts';
import type { Unchecked } from '#shared/rules/answer.ts';
import { capital } from '#shared/rules/words.ts';
import { useBatchPatch } from '../../../api/batches.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { useBoardPanel } from '../view/useBoardPanel.ts';
import { InlineQuantity } from './InlineQuantity.tsx';
import {
  isNumberField,
  LISTS,
  missingFields,
  NUMBERS,
  type MissingField,
} from './missingFields.ts';
import { PanelPart } from './PanelFrame.tsx';
import { RULE_QUESTIONS } from './ruleWords.ts';

interface UncheckedFieldsProps {
  earlier: Batch;
  later: Batch;
  unchecked: readonly Unchecked[];
}

/** What could not be checked, with the facts that are missing to be filled in here. */
export function UncheckedFields({ earlier, later, unchecked }: UncheckedFieldsProps) {
  const { can } = useBoardView();
  if (unchecked.length === 0) return null;
  const fields = missingFields(unchecked, [earlier, later]);
  const words = unchecked.map((rule) => RULE_QUESTIONS[rule.rule]).join(' · ');
  return (
    <PanelPart title={`Not checked: ${unchecked.length}`}>
      <p className="mt-1 text-ink2">{capital(words)}</p>
      {can.editBatches ? (
        <div className="mt-2 grid gap-3">
          {fields.map((field) => (
            <FieldOf key={field.key} missing={field} />
          ))}
          <EditLinks batches={unchecked.some(isElsewhere) ? [earlier, later] : []} />
        </div>
      ) : (
        <p className="mt-1 text-ink2">Whoever keeps these batches has not written it down yet.</p>
      )}
      <SlurryUnknown batch={earlier} unchecked={unchecked} />
    </PanelPart>
  );
}

/** Slurry from outside whose allergens or cultures nobody knows leaves these checks open. */
function SlurryUnknown({ batch, unchecked }: { batch: Batch; unchecked: readonly Unchecked[] }) {
  const { index } = useBoardView();
  const chain = batch.chainId === null ? undefined : index.chain(batch.chainId);
  if (chain?.start.kind !== 'outside') return null;
  const { allergens, cultures } = chain.start;
  const lacking = [
    ...(allergens === null && unchecked.some(({ rule }) => rule === 'allergen')
      ? ['allergens']
      : []),
    ...(cultures === null && unchecked.some(({ rule }) => rule === 'wild-culture')
      ? ['cultures']
      : []),
  ];
  if (lacking.length === 0) return null;
  return (
    <p className="mt-2 text-ink2">
      The {lacking.join(' and ')} of the slurry that {chain.name} starts from are not written down:
      edit the shelf once you know them.
    </p>
  );
}

/** Days and vessels are filled in where they belong. */
const isElsewhere = (rule: Unchecked) =>
  rule.missing.some((name) => !isNumberField(name) && !(name in LISTS) && name !== 'dryHop');

function EditLinks({ batches }: { batches: readonly Batch[] }) {
  const { open } = useBoardPanel();
  if (batches.length === 0) return null;
  return (
    <div className="flex flex-wrap gap-2">
      {batches.map((batch) => (
        <Button
          key={batch.id}
          size="small"
          look="quiet"
          className="max-w-full"
          onClick={() => open({ kind: 'batch', batchId: batch.id })}
        >
          <span className="truncate">Edit {batch.name}</span>
        </Button>
      ))}
    </div>
  );
}

function FieldOf({ missing }: { missing: MissingField }) {
  const { slug } = useBoardView();
  const { open } = useBoardPanel();
  const patch = useBatchPatch(slug);
  const { batch, field } = missing;
  const row = { id: batch.id, version: batch.version };
  return (
    <div>
      {isNumberField(field) ? (
        <InlineQuantity
          kind={NUMBERS[field].kind}
          label={`${NUMBERS[field].label} of ${batch.name}`}
          value={null}
          disabled={patch.isPending}
          onSave={(value, typed) =>
            patch.mutate({
              ...row,
              patch: {
                [field]: value,
                ...(typed && { typed: { ...batch.typed, [field]: typed } }),
              },
            })
          }
        />
      ) : (
        <>
          <p className="mb-1 text-small font-semibold">
            {LISTS[field].label} of {batch.name}
          </p>
          <div className="flex flex-wrap gap-2">
            <Button
              size="small"
              look="quiet"
              disabled={patch.isPending}
              onClick={() => patch.mutate({ ...row, patch: { [field]: [] } })}
            >
              {LISTS[field].none}
            </Button>
            <Button
              size="small"
              look="quiet"
              onClick={() => open({ kind: 'batch', batchId: batch.id })}
            >
              Say which
            </Button>
          </div>
        </>
      )}
      {patch.error && (
        <Notice kind="hold" alert className="mt-2">
          {sentenceOf(patch.error)}
        </Notice>
      )}
    </div>
  );
}
