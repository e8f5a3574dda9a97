/**
 * A browser's manners in a thread of its own, so that its work does not count as the server's: signs
 * somebody up, then sends what it is told to send and answers status, bytes and milliseconds.
 */
import { parentPort, workerData } from 'node:worker_threads';

const { url } = workerData;
const cookies = new Map();

async function send(method, path, body) {
  const begin = performance.now();
  const reply = await fetch(url + path, {
    method,
    headers: {
      'content-type': 'application/json',
      cookie: [...cookies].map(([name, value]) => `${name}=${value}`).join('; '),
      'x-xsrf-token': decodeURIComponent(cookies.get('XSRF-TOKEN') ?? ''),
    },
    ...(body === undefined ? {} : { body: JSON.stringify(body) }),
  });
  for (const cookie of reply.headers.getSetCookie()) {
    const [, name, value] = /^([^=]+)=([^;]*)/.exec(cookie);
    cookies.set(name, value);
  }
  const text = await reply.text();
  return { status: reply.status, text, ms: performance.now() - begin };
}

await send('GET', '/api/session');
await send('POST', '/api/accounts', {
  email: 'bench@example.org',
  name: 'Bench',
  password: 'amber dial glass',
});
parentPort.on('message', async ({ path, body }) => {
  const { status, text, ms } = await send('POST', path, body);
  const problem = status < 300 ? '' : text;
  parentPort.postMessage({ status, bytes: text.length, ms, problem, text: text.slice(0, 1000) });
});
parentPort.postMessage('ready');
