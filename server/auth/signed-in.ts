/** The person behind a request, with the session that says so. */
export interface SignedIn {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly emailVerified: boolean;
  readonly sessionId: string;
}
