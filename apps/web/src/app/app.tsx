import { AppRouter } from './app-router.tsx';
import { ErrorBoundary } from './error-boundary.tsx';
import { Providers } from './providers.tsx';

/** The whole web app. */
export function App() {
  return (
    <ErrorBoundary>
      <Providers>
        <AppRouter />
      </Providers>
    </ErrorBoundary>
  );
}
