import { QueryErrorResetBoundary } from '@tanstack/react-query';
import { Component, type ReactNode } from 'react';
import { reportClientError } from '../../../api/clientErrors.ts';
import { OfflineError, ProblemError, sentenceOf } from '../../../api/errors.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';

interface FaultProps {
  children: ReactNode;
  onRetry: () => void;
}

/** What could not be read is told with a way to try again; the bar above stays. */
class Fault extends Component<FaultProps, { error: unknown }> {
  override state = { error: null as unknown };

  static getDerivedStateFromError(error: unknown) {
    return { error };
  }

  override componentDidCatch(error: unknown) {
    const isToldByServer = error instanceof ProblemError || error instanceof OfflineError;
    if (!isToldByServer) reportClientError(error, location.pathname);
  }

  readonly retry = () => {
    this.props.onRetry();
    this.setState({ error: null });
  };

  override render() {
    if (this.state.error === null) return this.props.children;
    return (
      <main id="main" className="mx-auto w-full max-w-xl grow p-7 outline-none">
        <h1 className="text-h1">The board could not be shown</h1>
        <Notice kind="hold" alert className="mt-4">
          {sentenceOf(this.state.error)}
        </Notice>
        <Button look="first" className="mt-4" onClick={this.retry}>
          Try again
        </Button>
      </main>
    );
  }
}

export function BoardFault({ children }: { children: ReactNode }) {
  return (
    <QueryErrorResetBoundary>
      {({ reset }) => <Fault onRetry={reset}>{children}</Fault>}
    </QueryErrorResetBoundary>
  );
}
