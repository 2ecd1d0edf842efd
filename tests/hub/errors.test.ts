import express from 'express';
import request from 'supertest';
import { expect, it, vi } from 'vitest';
import { errorHandler, notFound } from '../../server/errors.ts';
import { Fault } from '../../server/fault.ts';

function failingWith(error: unknown) {
  const log = vi.fn();
  const app = express();
  app.get('/', () => {
    throw error;
  });
  app.use(notFound, errorHandler(log));
  return { log, answer: request(app).get('/') };
}

it('sends a fault as its code, path and values', async () => {
  const fault = new Fault('document.tooLarge', 413, { limit: 5 }, ['states', 2]);
  const { log, answer } = failingWith(fault);
  const { status, body } = await answer;
  expect(status).toBe(413);
  expect(body).toEqual({
    error: { code: 'document.tooLarge', path: ['states', 2], params: { limit: 5 } },
  });
  expect(log).not.toHaveBeenCalled();
});

it.each([new Error('the password is x'), 'a string', null])(
  'logs what went wrong inside and sends neither word nor stack: %s',
  async (error) => {
    const { log, answer } = failingWith(error ?? new TypeError('null'));
    const { status, text } = await answer;
    expect(status).toBe(500);
    expect(JSON.parse(text)).toEqual({ error: { code: 'hub.internal', path: [], params: {} } });
    expect(log).toHaveBeenCalledOnce();
  },
);
