import type { Role } from './roles';

export interface SignUpBody {
  name: string;
  email: string;
  password: string;
  companyName: string;
  /** IANA name; the server falls back to UTC. */
  timeZone?: string;
}

export interface SignInBody {
  email: string;
  password: string;
}

export interface Me {
  user: { id: string; name: string; email: string };
  company: { id: string; name: string; timeZone: string };
  role: Role;
  can: { createJobs: boolean };
}

/** What sign-up, sign-in and refresh answer; the refresh token travels in an HttpOnly cookie. */
export interface SessionAnswer {
  accessToken: string;
  /** Seconds. */
  expiresIn: number;
  me: Me;
}
