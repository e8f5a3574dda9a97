import supertest from 'supertest';

type Agent = ReturnType<typeof supertest.agent>;
export type Reply = ReturnType<Agent['get']>;
type Changing = 'post' | 'put' | 'delete';

/** A browser's manners over supertest: keeps cookies and sends the request token back. */
export class ApiClient {
  private readonly agent: Agent;
  private readonly token: string;

  private constructor(agent: Agent, token: string) {
    this.agent = agent;
    this.token = token;
  }

  static async open(url: string): Promise<ApiClient> {
    const agent = supertest.agent(url);
    const { headers } = await agent.get('/api/session');
    const cookies = [headers['set-cookie'] ?? []].flat().join('\n');
    const [, token = ''] = /^XSRF-TOKEN=([^;]+)/m.exec(cookies) ?? [];
    return new ApiClient(agent, decodeURIComponent(token));
  }

  get(path: string): Reply {
    return this.agent.get(path);
  }

  post(path: string, body?: object): Reply {
    return this.change('post', path, body);
  }

  put(path: string, body?: object): Reply {
    return this.change('put', path, body);
  }

  delete(path: string): Reply {
    return this.change('delete', path);
  }

  /** A changing call that carries the token; without a body it can be given any by `.send`. */
  change(method: Changing, path: string, body?: object): Reply {
    const reply = this.agent[method](path).set('X-XSRF-TOKEN', this.token);
    return body === undefined ? reply : reply.send(body);
  }
}
