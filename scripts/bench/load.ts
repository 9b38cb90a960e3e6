import { Agent, request } from 'node:http';
import { performance } from 'node:perf_hooks';

/** One request a lane can send; null when it has run out. */
export interface LoadRequest {
  path: string;
  body: string;
  cookie?: string;
}

function post(agent: Agent, port: number, { path, body, cookie }: LoadRequest): Promise<number> {
  return new Promise((resolve, reject) => {
    const headers: Record<string, string> = {
      'content-type': 'application/json',
      'content-length': String(Buffer.byteLength(body)),
      origin: `http://127.0.0.1:${port}`,
    };
    if (cookie !== undefined) headers.cookie = cookie;
    const sent = request({ agent, host: '127.0.0.1', port, path, method: 'POST', headers }, (reply) => {
      reply.resume();
      reply.on('end', () => resolve(reply.statusCode ?? 0));
      reply.on('error', reject);
    });
    sent.on('error', reject);
    sent.end(body);
  });
}

/** Sends what each lane's source gives, one request after another a lane, for some seconds; requests answered a second. */
export async function throughput(options: {
  port: number;
  seconds: number;
  lanes: readonly (() => LoadRequest | null)[];
}): Promise<number> {
  const { port, seconds, lanes } = options;
  const agent = new Agent({ keepAlive: true, maxSockets: lanes.length });
  const began = performance.now();
  const until = began + seconds * 1000;
  let answered = 0;
  await Promise.all(
    lanes.map(async (source) => {
      while (performance.now() < until) {
        const next = source();
        if (next === null) throw new Error('a lane of the benchmark ran out of requests');
        const status = await post(agent, port, next);
        if (status !== 200) throw new Error(`${next.path} answered ${status}`);
        answered += 1;
      }
    }),
  );
  const spent = (performance.now() - began) / 1000;
  agent.destroy();
  return answered / spent;
}
