import { useQueryClient } from '@tanstack/react-query';
import { Component, useCallback, type ReactNode } from 'react';
import { boardQuery } from '../../../api/board.ts';
import { isProblem, sentenceOf } from '../../../api/errors.ts';
import { Notice } from '../../../components/ui/Notice.tsx';

interface BoundaryProps {
  name: string;
  onFault: () => void;
  children: ReactNode;
}

/** A shelf that can no longer be read takes nothing else of the board with it. */
class Boundary extends Component<BoundaryProps, { error: unknown }> {
  override state = { error: null as unknown };

  static getDerivedStateFromError(error: unknown) {
    return { error };
  }

  override componentDidCatch() {
    this.props.onFault();
  }

  override render() {
    const { error } = this.state;
    if (error === null) return this.props.children;
    return (
      <Notice className="mx-7 my-3 max-tablet:mx-[18px]">
        {isProblem(error, 'not-found')
          ? `${this.props.name} is no longer shared with you.`
          : `${this.props.name}: ${sentenceOf(error)}`}
      </Notice>
    );
  }
}

export function GuestFault(props: { name: string; slug: string; children: ReactNode }) {
  const { name, slug, children } = props;
  const client = useQueryClient();
  const onFault = useCallback(() => {
    void client.invalidateQueries({ queryKey: boardQuery(slug).queryKey });
  }, [client, slug]);
  return (
    <Boundary name={name} onFault={onFault}>
      {children}
    </Boundary>
  );
}
