import { useState } from 'react';
import type { HouseRuleChanges } from '#shared/api/board.ts';
import { houseRules as contract, type HouseRulesRow } from '#shared/api/houseRules.ts';
import type { HouseRuleKey } from '#shared/rules/houseRules.ts';
import type { RuleId } from '#shared/rules/vocabulary.ts';
import { isProblem, ProblemError, sentenceOf } from '../../api/errors.ts';
import { useHouseRulesPut } from '../../api/houseRules.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useUnits } from '../../app/useUnits.ts';
import { rewrite } from '../../components/form/written.ts';
import { say } from '../../components/ui/Toast.tsx';
import type { Explained } from '../checks/rulesExplained.ts';
import { backToDefault, changesOf, draftOf, faultsOf, type Draft, type Faults } from './draft.ts';

export interface RulesEdit {
  draft: Draft;
  faults: Faults;
  /** What would be saved. */
  changes: HouseRuleChanges;
  /** No field has a fault. */
  isSound: boolean;
  isDirty: boolean;
  isSaving: boolean;
  failure: string | null;
  /** Somebody saved in the meantime: how the rules stand now. */
  theirs: HouseRulesRow | null;
  type(key: HouseRuleKey, text: string): void;
  soften(rule: RuleId, on: boolean): void;
  reset(rule: Explained['id']): void;
  resetAll(): void;
  leave(): void;
  save(): void;
  /** Takes theirs in place of what was typed. */
  takeTheirs(): void;
  /** Saves what was typed over theirs. */
  saveOver(): void;
}

/** What is typed, beside the rules as they are stored. A form that is not touched follows these. */
export function useRulesDraft(row: HouseRulesRow): RulesEdit {
  const units = useUnits();
  const { slug } = useBrewery();
  const put = useHouseRulesPut(slug);
  const [base, setBase] = useState(row);
  const [draft, setDraft] = useState(() => draftOf(row.changes, units));
  const [failure, setFailure] = useState<string | null>(null);
  const [theirs, setTheirs] = useState<HouseRulesRow | null>(null);
  const changes = changesOf(draft);
  const faults = faultsOf(draft, units);
  const isSound = Object.keys(faults).length === 0;
  const isDirty = !isSound || text(changes) !== text(base.changes);

  const begin = (from: HouseRulesRow) => {
    setBase(from);
    setDraft(draftOf(from.changes, units));
    setFailure(null);
    setTheirs(null);
  };
  if (row.version !== base.version && !isDirty) begin(row);

  const send = (version: number) => {
    if (!isSound) return setFailure('Mend the fields that are marked, then save.');
    put.mutate(
      { version, changes },
      {
        onSuccess: (saved) => {
          begin(saved);
          say('House rules saved.');
        },
        onError: (error) => {
          const now = isProblem(error, 'changed-since')
            ? contract.safeParse(error.problem.current)
            : null;
          if (now?.success) setTheirs(now.data);
          else setFailure(refusal(error));
        },
      },
    );
  };

  return {
    draft,
    faults,
    changes,
    isSound,
    isDirty,
    isSaving: put.isPending,
    failure,
    theirs,
    type(key, value) {
      setFailure(null);
      setDraft((now) => ({
        ...now,
        limits: { ...now.limits, [key]: rewrite(now.limits[key], value, units) },
      }));
    },
    soften: (rule, on) =>
      setDraft((now) => ({
        ...now,
        softened: on ? [...now.softened, rule] : now.softened.filter((each) => each !== rule),
      })),
    reset: (rule) => setDraft((now) => backToDefault(now, rule, units)),
    resetAll: () => setDraft(draftOf({}, units)),
    leave: () => begin(row),
    save: () => send(base.version),
    takeTheirs: () => theirs && begin(theirs),
    saveOver() {
      if (!theirs) return;
      setBase(theirs);
      setTheirs(null);
      send(theirs.version);
    },
  };
}

function text({ softened = [], ...limits }: HouseRuleChanges): string {
  const sorted = Object.entries(limits).toSorted(([a], [b]) => (a < b ? -1 : 1));
  return JSON.stringify([sorted, softened.toSorted()]);
}

function refusal(error: unknown): string {
  const errors = error instanceof ProblemError ? error.problem.errors : undefined;
  return errors?.[0]?.detail ?? sentenceOf(error);
}
