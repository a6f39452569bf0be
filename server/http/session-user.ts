declare global {
  namespace Express {
    /** What passport puts on the request: who the session belongs to, read fresh from the database after that. */
    interface User {
      personId: number;
    }
  }
}

export {};
