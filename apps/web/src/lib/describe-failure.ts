import { errorTitles } from '#shared/errors.ts';
import { ApiProblem, NetworkProblem } from '#web/lib/http.ts';

/** What to tell a person about any failure: what is wrong and what to do. */
export function describeFailure(error: unknown): {
  readonly title: string;
  readonly detail: string;
} {
  if (error instanceof NetworkProblem) {
    return {
      title: 'We cannot reach the studio just now',
      detail: 'Check your connection and try again. What you wrote is kept.',
    };
  }
  if (error instanceof ApiProblem) {
    return { title: error.message, detail: error.detail };
  }
  return {
    title: errorTitles.internal,
    detail: 'Please try again; if it goes on, write to the studio.',
  };
}
