/** Calls a route's handler as Next would. */

type Handler<P> = (request: Request, context: { params: Promise<P> }) => Promise<Response>;

interface Call {
  method?: string;
  body?: unknown;
  /** Sent as it stands instead of a body in JSON. */
  raw?: string;
  /** Sent instead, as a browser sends a form with files. */
  form?: FormData;
  headers?: Record<string, string>;
  query?: Record<string, string>;
}

export function call<P>(
  handler: Handler<P>,
  params: P,
  { method = 'GET', body, raw, form, headers = {}, query = {} }: Call = {},
): Promise<Response> {
  const text = raw ?? (body === undefined ? undefined : JSON.stringify(body));
  const request = new Request(
    `http://127.0.0.1:3000/api?${new URLSearchParams(query).toString()}`,
    {
      method,
      headers: {
        host: '127.0.0.1:3000',
        ...(text !== undefined && { 'content-type': 'application/json' }),
        ...headers,
      },
      ...(form ? { body: form } : text !== undefined && { body: text }),
    },
  );
  return handler(request, { params: Promise.resolve(params) });
}

/** The answer of a refusal, for its code and message. */
export async function refusal(
  response: Response,
): Promise<{ code: string; message: string; field?: string }> {
  const { error } = (await response.json()) as {
    error: { code: string; message: string; field?: string };
  };
  return error;
}
