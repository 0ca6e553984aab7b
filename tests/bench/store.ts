import type { Express } from 'express';
import request from 'supertest';
import { buildSlingRequest } from '../factories/slingRequest';
import { DEMO_DOMAIN, DEMO_PASSWORD } from '../../server/demo/people';

/** Signs in and answers the session's cookie. */
export async function benchClient(app: Express, email: string, password: string): Promise<string> {
  const answer = await request(app).post('/api/session').send({ email, password });
  const cookie: unknown = answer.headers['set-cookie'];
  if (!Array.isArray(cookie)) throw new Error(`The bench cannot sign in: ${answer.text}`);
  return String(cookie[0]).split(';')[0] ?? '';
}

/** Registers and labels slings over the API. */
export async function openBenchStore(app: Express, count: number): Promise<{ id: number; code: string }[]> {
  const agent = request.agent(app);
  await agent.post('/api/session').send({ email: `storekeeper@${DEMO_DOMAIN}`, password: DEMO_PASSWORD });
  const made: { id: number; code: string }[] = [];
  for (let n = 0; n < count; n += 1) {
    const sling = await agent.post('/api/slings').send(buildSlingRequest(1));
    const { id } = sling.body as { id: number };
    const run = await agent.post('/api/label-runs').send({ slingIds: [id], stock: 'roll-203-flat' });
    const { tags } = run.body as { tags: { code: string }[] };
    made.push({ id, code: tags[0]?.code ?? '' });
  }
  return made;
}
