import express, { type RequestHandler } from 'express';

import { InvalidError, UnsupportedMediaError } from './errors.ts';

/** Reads a JSON body of limited size; anything else is refused by name. */
export function jsonBody(limit: string): RequestHandler[] {
  const isJson: RequestHandler = (request, _response, next) => {
    const kind = request.is('application/json');
    if (kind === false) {
      throw new UnsupportedMediaError('Send JSON, with Content-Type: application/json.');
    }
    if (kind === null) throw new InvalidError({ path: '', message: 'Send a JSON body.' });
    next();
  };
  return [isJson, express.json({ limit, type: 'application/json' })];
}
