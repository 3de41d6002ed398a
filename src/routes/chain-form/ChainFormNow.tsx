import { useState } from 'react';
import { chain as chainContract, chainCreate, type Chain } from '#shared/api/chain.ts';
import { useBoard } from '../../api/board.ts';
import { useChainCreate, useChainPatch } from '../../api/chains.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useUnits } from '../../app/useUnits.ts';
import { RowForm } from '../../components/form/RowForm.tsx';
import { LinkButton } from '../../components/ui/LinkButton.tsx';
import { ChainFields } from './ChainFields.tsx';
import { chainShape, chainValues } from './chainValues.ts';
import { chainLabel, chainWords } from './chainWords.ts';

export interface ChainFormProps {
  /** Null: a new one. */
  chain: Chain | null;
  onDone: (id: string) => void;
  onCancel?: () => void;
}

export function ChainFormNow({ chain, onDone, onCancel }: ChainFormProps) {
  const { slug, path } = useBrewery();
  const board = useBoard();
  const units = useUnits();
  const create = useChainCreate(slug);
  const patch = useChainPatch(slug);
  const [values] = useState(() => chainValues(chain, board, units));
  if (board.yeasts.length === 0)
    return (
      <div className="space-y-4">
        <p>A shelf lives on one yeast, and none is written down yet.</p>
        <LinkButton look="first" to={path('yeasts')}>
          Write down a yeast
        </LinkButton>
      </div>
    );
  return (
    <RowForm
      row={chain}
      rowSchema={chainContract}
      contract={chainCreate}
      keepsTyped={false}
      values={values}
      shape={chainShape}
      create={create.mutateAsync}
      patch={patch.mutateAsync}
      labelOf={chainLabel}
      wordsOf={(key, facts) => chainWords(key, facts, board)}
      action={chain ? 'Save' : 'Put up the shelf'}
      {...(onCancel && { onCancel })}
      onDone={onDone}
    >
      <ChainFields chainId={values.id} />
    </RowForm>
  );
}
