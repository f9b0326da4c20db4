import type { Definition } from '@shared/contracts/definition.ts';
import type { Family } from '@shared/contracts/families.ts';
import type { Revision, Sweep } from '@shared/contracts/revisions.ts';

const password = 'harrow quay drawing office';

/** Somebody of the demo firm, signed in over HTTP as a browser would. */
export class Caller {
  private readonly cookies = new Map<string, string>();

  private constructor(private readonly url: string) {}

  static async signIn(url: string, who: string): Promise<Caller> {
    const caller = new Caller(url);
    await caller.call('POST', '/api/auth/sign-in', { email: `${who}@harrowquay.example`, password });
    return caller;
  }

  async call<T>(method: string, path: string, body?: object, version?: number): Promise<T> {
    const answer = await fetch(`${this.url}${path}`, {
      method,
      headers: {
        Origin: this.url,
        Cookie: [...this.cookies].map((pair) => pair.join('=')).join('; '),
        ...(body ? { 'Content-Type': 'application/json' } : {}),
        ...(version === undefined ? {} : { 'If-Match': `"${version}"` }),
      },
      ...(body ? { body: JSON.stringify(body) } : {}),
    });
    for (const cookie of answer.headers.getSetCookie()) {
      const [name = '', value = ''] = cookie.split(';')[0]!.split('=');
      this.cookies.set(name, value);
    }
    const text = await answer.text();
    if (!answer.ok) throw new Error(`${method} ${path}: ${answer.status} ${text}`);
    return (text === '' ? undefined : JSON.parse(text)) as T;
  }

  /** Defines a family and asks for its sweep. */
  async beginSweep(code: string, definition: Definition): Promise<Sweep> {
    const family = await this.call<Family>('POST', '/api/families', {
      code,
      title: 'Under fire',
      definition,
    });
    const id = family.working!.id;
    const { lockVersion } = await this.call<Revision>('GET', `/api/revisions/${id}`);
    return this.call<Sweep>('POST', `/api/revisions/${id}/sweep`, undefined, lockVersion);
  }

  /** Looks until the sweep is as far as is asked, through whatever the server is going through. */
  async sweepUntil(id: number, enough: (sweep: Sweep) => boolean, withinSeconds: number): Promise<Sweep> {
    let last: unknown = 'nothing heard';
    for (const end = Date.now() + withinSeconds * 1000; Date.now() < end;) {
      try {
        const sweep = await this.call<Sweep>('GET', `/api/sweeps/${id}`);
        if (enough(sweep)) return sweep;
        last = sweep;
      } catch (error) {
        last = error;
      }
      await new Promise((resolve) => setTimeout(resolve, 30));
    }
    throw new Error(
      `The sweep did not come so far: ${last instanceof Error ? last.message : JSON.stringify(last)}`,
    );
  }
}

/** Checks and publishes a swept revision; the hash over all of its cells. */
export async function publish(url: string, revisionId: number, code: string): Promise<string> {
  const manager = await Caller.signIn(url, 'standards');
  const engineer = await Caller.signIn(url, 'engineer');
  const path = `/api/revisions/${revisionId}`;
  const version = async () => (await manager.call<Revision>('GET', path)).lockVersion;
  await manager.call('POST', `${path}/submit`, {}, await version());
  await engineer.call('POST', `${path}/sign`, { comment: 'Agrees.' }, await version());
  const issued = await manager.call<Revision>('POST', `${path}/publish`, { confirm: code }, await version());
  return issued.contentHash!;
}
