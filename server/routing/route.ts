import type { Request, Response } from 'express';
import type { z } from 'zod';
import type { RouteKey } from '../../shared/domain/access/routes';
import type { ReadContext, Services, WriteContext } from '../context';

/** Which limit on repeated calls a route has besides the general one. */
export type LimitName = 'guess' | 'publicRead' | 'publicWrite' | 'upload';

interface RouteDocs {
  summary: string;
  /** Schema of the answer's body, for the API's own description; left out where the answer is a file or empty. */
  response?: z.ZodType;
  /** Content type of an answer that is not JSON. */
  produces?: string;
  /** Content type of a body that is not JSON. */
  consumes?: string;
  limit?: LimitName;
}

export interface Answer<B = unknown> {
  status?: number;
  body?: B;
  /** Version of the record in `body`, sent as ETag. */
  version?: number;
}

interface Input<P, Q> {
  params: P;
  query: Q;
}

/** A GET that answers JSON. */
export interface ReadRoute<P, Q> extends RouteDocs {
  kind: 'read';
  route: RouteKey;
  params?: z.ZodType<P>;
  query?: z.ZodType<Q>;
  handle: (context: ReadContext, input: Input<P, Q>) => Promise<Answer>;
}

/** A write: `load` answers 404 before the body is looked at; `handle` runs in one transaction and may run again after a deadlock. */
export interface WriteRoute<P, B, L, R> extends RouteDocs {
  kind: 'write';
  route: RouteKey;
  params?: z.ZodType<P>;
  /** The body's schema, or a choice of it by the path. */
  body?: z.ZodType<B> | ((params: P) => z.ZodType<B>);
  bodyDocs?: z.ZodType;
  load?: (context: Omit<WriteContext, 'transaction' | 'at'>, params: P) => Promise<L>;
  /** Slow work that needs no transaction, such as drawing codes; once, however often `handle` runs. */
  prepare?: (context: Omit<WriteContext, 'transaction' | 'at'>, input: { params: P; body: B }) => Promise<R>;
  /** Leaves the stored repeat answer without its body: it holds a secret that is shown once. */
  isSecret?: boolean;
  handle: (
    context: WriteContext,
    input: { params: P; body: B; loaded: L; prepared: R; ifMatch: number | null },
  ) => Promise<Answer>;
}

/** For what is no JSON in, JSON out: files, PDFs, the session itself. */
export interface RawRoute<P, Q> extends RouteDocs {
  kind: 'raw';
  route: RouteKey;
  params?: z.ZodType<P>;
  query?: z.ZodType<Q>;
  body?: z.ZodType;
  handle: (
    services: Services,
    input: Input<P, Q> & { request: Request; response: Response },
  ) => Promise<void>;
}

/** A route as the registry keeps it; what its handlers take is checked where it is written. */
export interface Route {
  docs: RouteDocs & { params?: z.ZodType; query?: z.ZodType; body?: z.ZodType };
  route: RouteKey;
  run: (services: Services, request: Request, response: Response) => Promise<void>;
}
