import { randomUUID } from 'node:crypto';
import { appHeader, CreateTakeRequest, MeResponse, paths, TakeResponse } from '@thudline/contracts';
import request, { Test } from 'supertest';
import { TestApp } from './test-app';
import { shortTake, UploadFile } from './recordings';

export const origin = 'http://thudline.test';
export const rightPassword = 'correct horse battery';

/** A browser of somebody: keeps cookies, sends what our pages send. */
export class Browser {
  readonly agent: ReturnType<typeof request.agent>;

  constructor({ server }: Pick<TestApp, 'server'>) {
    this.agent = request.agent(server);
  }

  get(path: string): Test {
    return this.agent.get(path);
  }

  post(path: string, body?: object): Test {
    return this.written(this.agent.post(path)).send(body);
  }

  patch(path: string, body: object): Test {
    return this.written(this.agent.patch(path)).send(body);
  }

  delete(path: string): Test {
    return this.written(this.agent.delete(path));
  }

  upload({ files, ...fields }: Upload): Test {
    const test = this.written(this.agent.post(paths.takes));
    const texts = { ...fields, uploadKey: fields.uploadKey ?? randomUUID() };
    for (const [name, value] of Object.entries(texts)) {
      test.field(name, typeof value === 'string' ? value : JSON.stringify(value));
    }
    for (const file of files) test.attach('files', Buffer.from(file.bytes), file.name);
    return test;
  }

  written(test: Test): Test {
    return test.set(appHeader.name, appHeader.value).set('Origin', origin);
  }
}

export interface Upload extends Partial<Omit<CreateTakeRequest, 'tracks'>> {
  tracks: unknown;
  files: UploadFile[];
}

export class Person extends Browser {
  constructor(
    app: Pick<TestApp, 'server'>,
    readonly me: MeResponse,
    agent: Browser,
  ) {
    super(app);
    Object.assign(this, { agent: agent.agent });
  }

  /** A short take that is stored, not yet measured. */
  async makeTake(changed: Partial<Upload> = {}): Promise<TakeResponse> {
    const response = await this.upload({ ...shortTake(), ...changed });
    if (response.status !== 201) throw new Error(`The take was not made: ${response.text}`);
    return response.body as TakeResponse;
  }
}

export async function joined(app: Pick<TestApp, 'server'>, name = 'Juno'): Promise<Person> {
  const browser = new Browser(app);
  const email = `${name.toLowerCase()}-${randomUUID()}@example.org`;
  const response = await browser.post(paths.join, { name, email, password: rightPassword });
  if (response.status !== 201) throw new Error(`${name} could not join: ${response.text}`);
  return new Person(app, response.body as MeResponse, browser);
}
