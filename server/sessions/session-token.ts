import jwt from 'jsonwebtoken';

const ALGORITHM = 'HS256';

/** Signs the id of a session, so that a guessed or altered one never reaches the database. */
export const signSession = (sessionId: string, secret: string): string =>
  jwt.sign({}, secret, { algorithm: ALGORITHM, subject: sessionId });

/** The session a token names, or undefined if it is not one of ours. */
export function readSession(token: string, secret: string): string | undefined {
  try {
    const claims = jwt.verify(token, secret, { algorithms: [ALGORITHM] });
    return typeof claims === 'string' ? undefined : claims.sub;
  } catch (error) {
    if (error instanceof jwt.JsonWebTokenError) return undefined;
    throw error;
  }
}
