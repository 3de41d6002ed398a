import { Silhouette } from '../../components/drawn/Silhouette.tsx';
import { Button } from '../../components/ui/Button.tsx';
import { EmptyState } from '../../components/ui/EmptyState.tsx';

export function NoVessels({ onNew }: { onNew?: () => void }) {
  return (
    <EmptyState
      drawing={
        <div className="flex gap-3">
          <Silhouette shape="bucket" width={62} />
          <Silhouette shape="conical" width={62} />
          <Silhouette shape="carboy" width={62} />
        </div>
      }
      title="No vessel yet"
      action={
        onNew && (
          <Button look="first" onClick={onNew}>
            Write down the first vessel
          </Button>
        )
      }
    >
      A name, a shape and the size to the brim are enough. With them the headspace is checked before
      a strong wort meets a large cake.
    </EmptyState>
  );
}
