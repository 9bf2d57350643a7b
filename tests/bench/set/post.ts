import { Agent, request } from 'node:http';

/** Keeps connections open, as browsers and a reverse proxy do, and never makes a request wait for one. */
const agent = new Agent({ keepAlive: true, maxSockets: Number.POSITIVE_INFINITY });

/** Sends JSON and reads the answer to its end. @returns its status; 0 where there was none */
export function post(url: string, body: unknown, cookie?: string): Promise<number> {
  const text = JSON.stringify(body);
  const headers = {
    'content-type': 'application/json',
    'content-length': Buffer.byteLength(text),
    'sec-fetch-site': 'same-origin',
    ...(cookie === undefined ? {} : { cookie }),
  };
  return new Promise((answer) => {
    const sent = request(url, { method: 'POST', agent, headers }, (response) => {
      response.on('end', () => answer(response.statusCode ?? 0));
      response.on('error', () => answer(0));
      response.resume();
    });
    sent.on('error', () => answer(0));
    sent.end(text);
  });
}

export const closeConnections = (): void => agent.destroy();
