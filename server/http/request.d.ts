import type { Person } from "../db/models/index.ts";

declare global {
  namespace Express {
    interface User extends Person {}
    interface Request {
      /** Names the request in logs and problem documents. */
      id: string;
      user?: User | undefined;
    }
  }
}
