import { useQueryErrorResetBoundary } from '@tanstack/react-query';
import { Component, type ErrorInfo, type ReactNode } from 'react';
import { useLocation } from 'react-router-dom';
import { Button } from '#web/components/ui/button.tsx';
import { Failure } from '#web/components/ui/failure.tsx';
import { Notice } from '#web/components/ui/notice.tsx';
import { ApiProblem, NetworkProblem } from '#web/lib/http.ts';

type Props = {
  readonly children: ReactNode;
  /** Another value starts the part afresh, as going to another page does. */
  readonly resetKey?: string;
  /** Lets failed requests be sent again when the visitor asks for it. */
  readonly onRetry?: () => void;
};
type State = {
  readonly error: unknown;
  readonly failed: boolean;
  readonly resetKey: string | undefined;
};

/** Keeps a fault in one page from taking the others with it, and says so. */
export class ErrorBoundary extends Component<Props, State> {
  override state: State = { error: null, failed: false, resetKey: this.props.resetKey };

  static getDerivedStateFromError(error: unknown): Partial<State> {
    return { error, failed: true };
  }

  static getDerivedStateFromProps(props: Props, state: State): Partial<State> | null {
    return props.resetKey === state.resetKey
      ? null
      : { error: null, failed: false, resetKey: props.resetKey };
  }

  override componentDidCatch(error: Error, info: ErrorInfo): void {
    if (!isRefusal(error)) console.error(error, info.componentStack);
  }

  override render(): ReactNode {
    const { error, failed } = this.state;
    if (!failed) return this.props.children;
    if (isRefusal(error)) {
      return (
        <div className="page grid gap-5 py-10">
          <h1>Not just now</h1>
          <Failure
            error={error}
            onRetry={() => {
              this.props.onRetry?.();
              this.setState({ error: null, failed: false });
            }}
          />
        </div>
      );
    }
    return (
      <div className="page grid gap-5 py-10">
        <h1>This page has come apart</h1>
        <Notice tone="berry" live="assertive">
          <p>The fault is ours. What you wrote for an order is kept on this device.</p>
          <div>
            <Button onClick={() => window.location.reload()}>Load the page again</Button>
          </div>
        </Notice>
      </div>
    );
  }
}

function isRefusal(error: unknown): boolean {
  return error instanceof ApiProblem || error instanceof NetworkProblem;
}

/** The boundary around one page: going elsewhere leaves the fault behind. */
export function PageBoundary({ children }: { readonly children: ReactNode }) {
  const { pathname } = useLocation();
  const { reset } = useQueryErrorResetBoundary();
  return (
    <ErrorBoundary resetKey={pathname} onRetry={reset}>
      {children}
    </ErrorBoundary>
  );
}
