/** One member's browser, as far as the server can tell, and how long it was kept waiting. */

export interface Answer {
  readonly status: number;
  readonly body: unknown;
}

/** Requests of one kind. */
export interface Timing {
  readonly kind: string;
  readonly at: number;
  readonly ms: number;
  readonly status: number;
}

export class Client {
  constructor(
    private readonly address: string,
    private readonly cookie: string,
    private readonly timings: Timing[],
  ) {}

  /** Asks, reads the whole answer and notes the time. A broken connection counts as status 0. */
  async ask(kind: string, path: string, method = 'GET', body?: unknown): Promise<Answer> {
    const at = performance.now();
    let answer: Answer;
    try {
      const response = await fetch(this.address + path, {
        method,
        headers: {
          cookie: this.cookie,
          ...(body !== undefined && { 'content-type': 'application/json' }),
        },
        ...(body !== undefined && { body: JSON.stringify(body) }),
        signal: AbortSignal.timeout(30_000),
      });
      const text = await response.text();
      const json = response.headers.get('content-type')?.includes('json');
      answer = { status: response.status, body: json ? JSON.parse(text) : text };
    } catch {
      answer = { status: 0, body: null };
    }
    this.timings.push({ kind, at, ms: performance.now() - at, status: answer.status });
    return answer;
  }

  /** The same, until the server has its database again. */
  async insist(kind: string, path: string, method: string, body?: unknown): Promise<Answer> {
    for (;;) {
      const answer = await this.ask(kind, path, method, body);
      if (answer.status !== 503 && answer.status !== 0) return answer;
      await new Promise((resolve) => setTimeout(resolve, 500));
    }
  }
}
