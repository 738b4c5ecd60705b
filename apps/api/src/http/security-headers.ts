import { IncomingMessage, ServerResponse } from 'node:http';
import { Socket } from 'node:net';
import type { RequestHandler } from 'express';
import helmet from 'helmet';

/**
 * What a browser may do with our pages: run our own scripts and styles, show our own pictures and
 * those a person has just chosen (blob:), and nothing of anybody else's. Style attributes are let
 * through because the preview of a sent e-mail carries its look in them.
 */
export function securityHeaders(options: { secure: boolean }): RequestHandler {
  const ask = helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        imgSrc: ["'self'", 'blob:', 'data:'],
        styleSrc: ["'self'"],
        styleSrcAttr: ["'unsafe-inline'"],
        scriptSrc: ["'self'"],
        connectSrc: ["'self'"],
        fontSrc: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        ...(options.secure ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    strictTransportSecurity: options.secure ? { maxAge: 365 * 86_400 } : false,
    xFrameOptions: { action: 'deny' },
    referrerPolicy: { policy: 'same-origin' },
    crossOriginEmbedderPolicy: false,
  });
  // They are the same for every answer, so helmet is asked once.
  const model = new ServerResponse(new IncomingMessage(new Socket()));
  ask(model.req, model, () => undefined);
  const headers = Object.entries(model.getHeaders());
  return (_request, response, next) => {
    for (const [name, value] of headers) {
      if (value !== undefined) response.setHeader(name, value);
    }
    next();
  };
}
