import { useRef, useState, useSyncExternalStore } from 'react';
import { useNavigate } from 'react-router-dom';
import type { Estimate } from '#shared/contracts/estimates.ts';
import type { SubmittedOrder } from '#shared/contracts/orders.ts';
import { paths } from '#web/config/paths.ts';
import { ApiProblem } from '#web/lib/http.ts';
import { useSubmitOrder } from '../api/submit-order.ts';
import { orderToSend } from '../design/tidy-order.ts';
import { useWizard } from '../wizard/wizard-context.ts';
import { attemptFor, earlierBodies } from './attempt.ts';
import { isUnclear, readRefusal, type SendRefusal } from './refusal.ts';
import { rememberSent } from './sent-order.ts';

export type Sending = {
  readonly pending: boolean;
  readonly refusal: SendRefusal | null;
  /** A price agreed to after it had changed; it replaces what the page worked out before. */
  readonly agreed: Estimate | null;
  /** Sends the order as the page shows it, at the total the customer sees. */
  readonly send: (seenTotalMinor: number | null) => void;
  /** Forgets the refusal, once what it asked for was done. */
  readonly settle: () => void;
};

/**
 * Sends the order: once, whatever is pressed. The key and what was sent under it are in the draft
 * before the request leaves, so a lost answer, a reload or a second press ask for the same order.
 */
export function useSend(): Sending {
  const { values, attempt, noteAttempt, finish, queue } = useWizard();
  const navigate = useNavigate();
  const { mutateAsync } = useSubmitOrder();
  const onTheirWay = useSyncExternalStore(queue.subscribe, queue.snapshot);
  const busy = useRef(false);
  const [pending, setPending] = useState(false);
  const [refusal, setRefusal] = useState<SendRefusal | null>(null);
  const [agreed, setAgreed] = useState<Estimate | null>(null);

  const arrived = (answer: SubmittedOrder, earlierTry: boolean) => {
    const { date, windowStart } = values.day;
    if (date !== null && windowStart !== null) {
      rememberSent({ ...answer, email: values.you.email.trim(), date, windowStart, earlierTry });
    }
    void navigate(paths.orderSent, { replace: true });
    finish();
  };

  const trySending = async (seenTotalMinor: number | null) => {
    const body = JSON.stringify(orderToSend(values, seenTotalMinor));
    const next = attemptFor(body, attempt, () => crypto.randomUUID());
    noteAttempt(next);
    try {
      arrived(await mutateAsync({ body, key: next.key }), false);
      return;
    } catch (error) {
      const reused = error instanceof ApiProblem && error.code === 'key-reused';
      if (!reused) {
        // Refused: nothing was made of it, so the next try is a new one.
        if (!isUnclear(error)) noteAttempt(null);
        throw error;
      }
    }
    // An earlier body under this key had arrived: its order is the one there is.
    for (const earlier of earlierBodies(next, body).toReversed()) {
      try {
        arrived(await mutateAsync({ body: earlier, key: next.key }), true);
        return;
      } catch (error) {
        if (!(error instanceof ApiProblem && error.code === 'key-reused')) throw error;
      }
    }
    noteAttempt(null);
    await trySendingAfresh(body);
  };

  /** The key belongs to something this draft knows nothing of. */
  const trySendingAfresh = async (body: string) => {
    const next = attemptFor(body, null, () => crypto.randomUUID());
    noteAttempt(next);
    arrived(await mutateAsync({ body, key: next.key }), false);
  };

  const send = (seenTotalMinor: number | null) => {
    if (busy.current) return;
    if (onTheirWay.length > 0) {
      setRefusal({ kind: 'photos-under-way' });
      return;
    }
    busy.current = true;
    setPending(true);
    setRefusal(null);
    trySending(seenTotalMinor)
      .catch((error: unknown) => {
        const read = readRefusal(error);
        if (read.kind === 'price-changed') setAgreed(read.estimate);
        setRefusal(read);
      })
      .finally(() => {
        busy.current = false;
        setPending(false);
      });
  };

  return { pending, refusal, agreed, send, settle: () => setRefusal(null) };
}
