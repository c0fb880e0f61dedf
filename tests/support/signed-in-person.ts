/** A demo person who uses the HTTP surface of a started product, as a program would. */
export class SignedInPerson {
  private constructor(readonly address: string, private readonly cookie: string) {}

  static async signIn(address: string, { email, password }: { readonly email: string; readonly password: string }): Promise<SignedInPerson> {
    const answer = await fetch(`${address}/api/session`, {
      method: 'POST', headers: { 'content-type': 'application/json', origin: address, 'sec-fetch-site': 'same-origin' }, body: JSON.stringify({ email, password }),
    });
    if (!answer.ok) throw new Error(`Sign-in answered ${answer.status}.`);
    return new SignedInPerson(address, (answer.headers.get('set-cookie') ?? '').split(';')[0] ?? '');
  }

  /** Calls and reads the JSON answer. @throws Error with status and body when the answer is a refusal */
  async call<T>(method: string, path: string, body?: unknown): Promise<T> {
    const answer = await fetch(`${this.address}${path}`, {
      method,
      headers: { cookie: this.cookie, origin: this.address, 'sec-fetch-site': 'same-origin', ...(body === undefined ? {} : { 'content-type': 'application/json' }) },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
    const text = await answer.text();
    if (!answer.ok) throw new Error(`${method} ${path} answered ${answer.status}: ${text}`);
    return (text === '' ? undefined : JSON.parse(text)) as T;
  }

  async firstBench(): Promise<string> {
    const { benches } = await this.call<{ benches: { slug: string }[] }>('GET', '/api/session');
    const slug = benches[0]?.slug;
    if (slug === undefined) throw new Error('This person is in no bench.');
    return slug;
  }
}
