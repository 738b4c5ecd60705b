import type { Deps } from '#api/modules/deps.ts';
import { createRoutes } from '#api/http/route.ts';
import type { FeatureRoutes } from '#api/http/route.ts';
import { preparedMenu } from './menu.queries.ts';

/** What the studio makes, and what it says about it; the same for everybody. */
export function menuRoutes(_deps: Deps): FeatureRoutes {
  const routes = createRoutes('prepared');
  routes.add(
    {
      name: 'read-menu',
      method: 'get',
      path: '/api/menu',
      summary: 'The menu, prices, policies and the studio; the same for everyone.',
      produces: 'application/json',
    },
    async ({ request, response }) => {
      const prepared = await preparedMenu();
      response.setHeader('ETag', prepared.etag);
      response.setHeader('Cache-Control', 'public, max-age=0, must-revalidate');
      response.setHeader('Vary', 'Accept-Encoding');
      if (request.headers['if-none-match'] === prepared.etag) {
        response.statusCode = 304;
        response.end();
        return;
      }
      const accepted = request.headers['accept-encoding'] ?? '';
      const encoding = accepted.includes('br') ? 'br' : accepted.includes('gzip') ? 'gzip' : null;
      const body = encoding === null ? prepared.identity : prepared[encoding];
      if (encoding !== null) response.setHeader('Content-Encoding', encoding);
      response.setHeader('Content-Type', 'application/json; charset=utf-8');
      response.setHeader('Content-Length', body.byteLength);
      response.end(body);
    },
  );
  return routes;
}
