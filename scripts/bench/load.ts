import { Agent, request } from 'node:http';
import { performance } from 'node:perf_hooks';

/** One request of a lane; a POST when it has a body. */
export interface LoadRequest {
  path: string;
  body?: string;
  cookie?: string;
}

function send(agent: Agent, port: number, { path, body, cookie }: LoadRequest): Promise<number> {
  return new Promise((resolve, reject) => {
    const headers: Record<string, string> = { origin: `http://127.0.0.1:${port}` };
    if (body !== undefined) {
      headers['content-type'] = 'application/json';
      headers['content-length'] = String(Buffer.byteLength(body));
    }
    if (cookie !== undefined) headers.cookie = cookie;
    const sent = request(
      { agent, host: '127.0.0.1', port, path, method: body === undefined ? 'GET' : 'POST', headers },
      (reply) => {
        reply.resume();
        reply.on('end', () => resolve(reply.statusCode ?? 0));
        reply.on('error', reject);
      },
    );
    sent.on('error', reject);
    sent.end(body);
  });
}

/** Sends every lane's requests, one after another a lane and all lanes at once; requests answered a second. */
export async function throughput(port: number, lanes: readonly (readonly LoadRequest[])[]): Promise<number> {
  const agent = new Agent({ keepAlive: true, maxSockets: lanes.length });
  const began = performance.now();
  await Promise.all(
    lanes.map(async (requests) => {
      for (const one of requests) {
        const status = await send(agent, port, one);
        if (status !== 200) throw new Error(`${one.path} answered ${status}`);
      }
    }),
  );
  const seconds = (performance.now() - began) / 1000;
  agent.destroy();
  return lanes.reduce((sum, requests) => sum + requests.length, 0) / seconds;
}
