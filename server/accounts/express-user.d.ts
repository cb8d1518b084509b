declare global {
  namespace Express {
    /** `req.user`: an account (accounts-db.ts). */
    interface User {
      readonly id: string;
      readonly name: string;
      readonly email: string;
      readonly sessionEpoch: number;
    }
  }
}

export {};
