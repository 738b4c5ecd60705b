import type { Response } from 'express';
import express, { Router } from 'express';
import * as z from 'zod/mini';
import { mailboxPage, mailboxScript, messagePage } from './pages.ts';
import type { SmtpState } from './smtp-listener.ts';
import type { SmtpFailure } from './wire.ts';
import { messageFilter, plannedSmtpFailure } from './wire.ts';

const failureForm = z.object({
  kind: z.enum(['refuse-connection', 'refuse', 'defer', 'drop-after-data', 'slow']),
  times: z.coerce.number().check(z.int(), z.minimum(1)),
});

/** What the form on the page means by each kind. */
const formFailures: Record<SmtpFailure['kind'], SmtpFailure> = {
  'refuse-connection': { kind: 'refuse-connection', code: 421 },
  refuse: { kind: 'refuse', code: 550 },
  defer: { kind: 'defer', code: 451 },
  'drop-after-data': { kind: 'drop-after-data' },
  slow: { kind: 'slow', ms: 10_000 },
};

const pagePolicy =
  "default-src 'none'; style-src 'unsafe-inline'; script-src 'self'; connect-src 'self'; " +
  "img-src data:; frame-src 'self'; form-action 'self'; frame-ancestors 'none'";

/** A message is somebody else's markup: no scripts, no forms, pictures from this computer only. */
const messagePolicy =
  "sandbox allow-popups allow-popups-to-escape-sandbox; default-src 'none'; " +
  "style-src 'unsafe-inline'; img-src data: http://127.0.0.1:* http://localhost:*; " +
  "frame-ancestors 'self'";

/** Lets every link open in a new tab; the doctype stays first, where there is one. */
function inNewTabs(markup: string): string {
  const base = '<base target="_blank" />';
  return /<head[^>]*>/i.test(markup)
    ? markup.replace(/<head[^>]*>/i, (head) => head + base)
    : base + markup;
}

function notFound(response: Response): void {
  response.status(404).type('text').send('There is no such message.\n');
}

/** The mailbox's pages, and what `control.ts` talks to under `/api`. */
export function createMailboxRoutes({ mailbox, failures, calls }: SmtpState): Router {
  const router = Router();
  router.use((_request, response, next) => {
    response.set({
      'Content-Security-Policy': pagePolicy,
      'X-Content-Type-Options': 'nosniff',
      'Referrer-Policy': 'no-referrer',
      'Cache-Control': 'no-store',
    });
    next();
  });

  router.get('/', (_request, response) => {
    response.send(mailboxPage(mailbox.list({}), failures.list()));
  });

  router.get('/mailbox.js', (_request, response) => {
    response.type('js').send(mailboxScript);
  });

  router.get('/messages/:id', (request, response) => {
    const kept = mailbox.find(request.params.id);
    if (kept === undefined) return notFound(response);
    response.send(messagePage(kept.message));
  });

  router.get('/messages/:id/html', (request, response) => {
    const kept = mailbox.find(request.params.id);
    if (kept === undefined || kept.message.html === null) return notFound(response);
    response.set('Content-Security-Policy', messagePolicy);
    response.type('html').send(inNewTabs(kept.message.html));
  });

  router.get('/messages/:id/raw', (request, response) => {
    const kept = mailbox.find(request.params.id);
    if (kept === undefined) return notFound(response);
    response.type('text/plain; charset=utf-8').send(kept.raw);
  });

  router.get('/messages/:id/attachments/:index', (request, response) => {
    const kept = mailbox.find(request.params.id);
    const attachment = kept?.attachments[Number(request.params.index)];
    const described = kept?.message.attachments[Number(request.params.index)];
    if (attachment === undefined || described === undefined) return notFound(response);
    response.attachment(described.filename).type(described.contentType).send(attachment.content);
  });

  router.post('/fail', express.urlencoded({ extended: false }), (request, response) => {
    const asked = failureForm.safeParse(request.body);
    if (asked.success) {
      failures.add({
        failure: formFailures[asked.data.kind],
        times: asked.data.times,
      });
    }
    response.redirect(303, '/');
  });

  router.post('/work', (_request, response) => {
    failures.clear();
    response.redirect(303, '/');
  });

  router.use('/api', express.json());

  router.get('/api/messages', (request, response) => {
    const filter = messageFilter.safeParse(request.query);
    if (!filter.success) {
      response.status(400).json(filter.error.issues);
      return;
    }
    response.json(mailbox.list(filter.data));
  });

  router.get('/api/messages/count', (_request, response) => {
    response.type('text').send(String(mailbox.list({}).length));
  });

  router.delete('/api/messages', (_request, response) => {
    mailbox.clear();
    response.sendStatus(204);
  });

  router.get('/api/calls', (request, response) => {
    const { since } = request.query;
    response.json(calls.list(typeof since === 'string' ? since : undefined));
  });

  router.post('/api/failures', (request, response) => {
    const planned = plannedSmtpFailure.safeParse(request.body);
    if (!planned.success) {
      response.status(400).json(planned.error.issues);
      return;
    }
    failures.add(planned.data);
    response.sendStatus(204);
  });

  router.delete('/api/failures', (_request, response) => {
    failures.clear();
    response.sendStatus(204);
  });

  return router;
}
