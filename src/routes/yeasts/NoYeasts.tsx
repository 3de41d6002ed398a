import { Logo } from '../../components/drawn/Logo.tsx';
import { Button } from '../../components/ui/Button.tsx';
import { EmptyState } from '../../components/ui/EmptyState.tsx';

export function NoYeasts({ onNew }: { onNew?: () => void }) {
  return (
    <EmptyState
      drawing={<Logo size={96} onPaper />}
      title="No yeast yet"
      action={
        onNew && (
          <Button look="first" onClick={onNew}>
            Write down the first yeast
          </Button>
        )
      }
    >
      A shelf needs one yeast. Its name and kind are enough to begin; its temperatures, printed on
      the pack, make the verdicts sharper.
    </EmptyState>
  );
}
