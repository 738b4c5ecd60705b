import { Writable } from 'node:stream';
import { describe, expect, it } from 'vitest';
import { createLogger } from './logger.ts';
import type { Logger } from './logger.ts';

function logged(write: (logger: Logger) => void): string {
  let text = '';
  const destination = new Writable({
    write(chunk: Buffer, _encoding, done) {
      text += chunk.toString();
      done();
    },
  });
  write(createLogger('info', destination));
  return text;
}

describe('the log', () => {
  it('holds no cookies, secrets or addresses', () => {
    const secret = 'tell-nobody';
    const text = logged((logger) => {
      logger.info({ req: { headers: { cookie: secret, authorization: secret } } }, 'request');
      logger.info({ res: { headers: { 'set-cookie': [secret] } } }, 'response');
      logger.info({ token: secret, key: secret }, 'link');
      logger.info({ body: { you: { email: secret, phone: secret }, password: secret } }, 'body');
      logger.info({ photo: { claimKey: secret } }, 'photo');
    });
    expect(text.trim().split('\n')).toHaveLength(5);
    expect(text).not.toContain(secret);
  });

  it('takes addresses out of errors', () => {
    const text = logged((logger) =>
      logger.error({ err: new Error('550 <ada@example.com>: no such user') }, 'refused'),
    );
    expect(text).toContain('550 <[address]>: no such user');
    expect(text).not.toContain('ada@example.com');
  });

  it('takes the rows of a database out of its errors', () => {
    const parent = Object.assign(new Error('SQLITE_CONSTRAINT'), { sql: "VALUES ('Ada Tarn')" });
    const error = Object.assign(new Error('not unique'), { parent, sql: parent.sql, code: 'E' });
    const text = logged((logger) => logger.error({ err: error }, 'failed'));
    expect(text).toContain('not unique');
    expect(text).not.toContain('Ada Tarn');
    expect(JSON.parse(text)).toMatchObject({ err: { type: 'Error', code: 'E' } });
  });

  it('keeps what is needed to find a fault', () => {
    const text = logged((logger) =>
      logger.error({ orderId: '42', err: new Error('no') }, 'failed'),
    );
    const line: unknown = JSON.parse(text);
    expect(line).toMatchObject({ orderId: '42', msg: 'failed', err: { message: 'no' } });
  });
});
