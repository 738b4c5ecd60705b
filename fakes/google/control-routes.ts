import express, { Router } from 'express';
import { overviewPage } from './chooser.ts';
import type { GoogleState } from './oauth-routes.ts';
import { people } from './people.ts';
import { googleClient, plannedGoogleFailure } from './wire.ts';

/** The page at `/` and what `control.ts` talks to; none of it exists at the real service. */
export function createControlRoutes({ clients, failures, calls }: GoogleState): Router {
  const router = Router();
  router.use('/api', express.json());

  router.get('/', (_request, response) => {
    response.send(overviewPage(calls.list().reverse()));
  });

  router.get('/api/people', (_request, response) => {
    response.json(people);
  });

  router.get('/api/calls', (request, response) => {
    const { since } = request.query;
    response.json(calls.list(typeof since === 'string' ? since : undefined));
  });

  router.put('/api/clients', (request, response) => {
    const client = googleClient.safeParse(request.body);
    if (!client.success) {
      response.status(400).json(client.error.issues);
      return;
    }
    clients.set(client.data.id, client.data);
    response.sendStatus(204);
  });

  router.get('/api/failures', (_request, response) => {
    response.json(failures.list());
  });

  router.post('/api/failures', (request, response) => {
    const planned = plannedGoogleFailure.safeParse(request.body);
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
