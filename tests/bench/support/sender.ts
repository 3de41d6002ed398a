import { Agent, request } from 'node:http';
import { gunzipSync } from 'node:zlib';

export interface Answer {
  status: number;
  /** From the asking until its last byte was here. */
  ms: number;
  body: Buffer;
  encoding: string | undefined;
}

/**
 * Posts JSON over connections that stay open. `fetch` would cost this machine half as much again as
 * the server that is measured.
 */
export function createSender(url: string, connections: number) {
  const agent = new Agent({ keepAlive: true, maxSockets: connections });
  const post = (cookie: string, content: unknown): Promise<Answer> =>
    new Promise((resolve, reject) => {
      const text = JSON.stringify(content);
      const start = performance.now();
      const asked = request(url, {
        agent,
        method: 'POST',
        headers: {
          cookie,
          origin: new URL(url).origin,
          'accept-encoding': 'gzip',
          'content-type': 'application/json',
          'content-length': Buffer.byteLength(text),
        },
      });
      asked.on('error', reject);
      asked.on('response', (answer) => {
        const parts: Buffer[] = [];
        answer.on('error', reject);
        answer.on('data', (part: Buffer) => parts.push(part));
        answer.on('end', () =>
          resolve({
            status: answer.statusCode ?? 0,
            ms: performance.now() - start,
            body: Buffer.concat(parts),
            encoding: answer.headers['content-encoding'],
          }),
        );
      });
      asked.end(text);
    });
  return { post, close: () => agent.destroy() };
}

/** What an answer says. Read when nothing is measured any more. */
export function textOf({ body, encoding }: Answer): string {
  return (encoding === 'gzip' ? gunzipSync(body) : body).toString();
}
