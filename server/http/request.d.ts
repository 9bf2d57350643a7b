import type { ReqId } from 'pino-http';
import type { SessionUser } from './session.ts';

declare global {
  namespace Express {
    interface User extends SessionUser {}
    interface Request {
      id: ReqId;
    }
  }
}
