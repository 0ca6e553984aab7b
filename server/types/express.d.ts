import 'passport';
import 'pino-http';
import type { SessionUser } from '../../shared/schemas/people';

declare global {
  namespace Express {
    /** Passport types the signed-in person through this interface. */
    interface User extends SessionUser {}
  }
}
