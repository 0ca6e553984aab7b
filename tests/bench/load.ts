import http from 'node:http';

export interface Call {
  method: 'GET' | 'POST';
  path: string;
  headers: Record<string, string>;
  body?: string;
}

/** Sends `total` calls over 16 kept connections to 127.0.0.1 and answers calls a second; any answer but 2xx ends it. */
export async function measureRate(
  port: number,
  total: number,
  next: (index: number) => Call,
): Promise<number> {
  const agent = new http.Agent({ keepAlive: true, maxSockets: 16 });
  let sent = 0;
  const started = performance.now();
  const work = async (): Promise<void> => {
    while (sent < total) {
      const index = sent;
      sent += 1;
      await send(agent, port, next(index));
    }
  };
  await Promise.all(Array.from({ length: 16 }, work));
  agent.destroy();
  return (total * 1000) / (performance.now() - started);
}

function send(agent: http.Agent, port: number, call: Call): Promise<void> {
  return new Promise((resolve, reject) => {
    const request = http.request(
      { host: '127.0.0.1', port, agent, method: call.method, path: call.path, headers: call.headers },
      (response) => {
        let text = '';
        response.setEncoding('utf8');
        response.on('data', (chunk: string) => (text += chunk));
        response.on('end', () => {
          const status = response.statusCode ?? 0;
          if (status >= 200 && status < 300) resolve();
          else reject(new Error(`${call.method} ${call.path}: ${status} ${text.slice(0, 300)}`));
        });
      },
    );
    request.on('error', reject);
    request.end(call.body);
  });
}
