import "next-auth";
import "next-auth/jwt";

/** The token says who and at which session version; roles and everything else are read from the database. */
declare module "next-auth" {
  interface Session {
    memberId: number;
    sessionVersion: number;
  }
  interface User {
    memberId: number;
    sessionVersion: number;
  }
}

declare module "next-auth/jwt" {
  interface JWT {
    memberId: number;
    sessionVersion: number;
  }
}
