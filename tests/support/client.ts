/** What a call was answered: `body` is the JSON, null where there is none. */
export interface Reply<Body> {
  readonly status: number;
  readonly headers: Headers;
  readonly body: Body;
  readonly text: string;
}

export interface Client {
  readonly name: string;
  readonly email: string;
  readonly password: string;
  /** The Cookie header that goes along with every call. */
  cookie: string;
  /** Makes the account and signs in; throws where that is refused. Answers this client. */
  readonly signUp: () => Promise<Client>;
  readonly signIn: (password?: string) => Promise<Client>;
  /** A call as a page of the site would make it. A string is sent as it is, anything else as JSON. */
  readonly call: <Body = Record<string, unknown>>(
    method: string,
    path: string,
    body?: unknown,
    headers?: Record<string, string>,
  ) => Promise<Reply<Body>>;
}

const parsed = (text: string): unknown => {
  try {
    return JSON.parse(text);
  } catch {
    return null;
  }
};

/** One person at one device. */
export function createClient(url: string, name: string): Client {
  const client: Client = {
    name,
    email: `${name.toLowerCase()}@team.example`,
    password: `${name}-and-the-kerb-stones`,
    cookie: '',
    signUp: () => enter('/api/auth/sign-up/email', { name, email: client.email, password: client.password }),
    signIn: (password = client.password) => enter('/api/auth/sign-in/email', { email: client.email, password }),
    call: async <Body>(method: string, path: string, body?: unknown, headers: Record<string, string> = {}) => {
      const response = await fetch(`${url}${path}`, {
        method,
        redirect: 'manual',
        headers: { origin: url, cookie: client.cookie, ...(body !== undefined && { 'content-type': 'application/json' }), ...headers },
        body: body === undefined ? undefined : typeof body === 'string' ? body : JSON.stringify(body),
      });
      const cookies = response.headers.getSetCookie().map((line) => line.split(';')[0]);
      if (cookies.length > 0) client.cookie = cookies.join('; ');
      const text = await response.text();
      return { status: response.status, headers: response.headers, body: parsed(text) as Body, text };
    },
  };
  async function enter(path: string, body: object): Promise<Client> {
    const { status, text } = await client.call('POST', path, body);
    if (status !== 200) throw new Error(`${name}: ${path} answered ${status}: ${text}`);
    return client;
  }
  return client;
}
