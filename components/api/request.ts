import './zod-setup';
import type * as z from 'zod';
import { apiErrorSchema } from '@/lib/schemas/api';
import { RequestError } from './request-error';

async function refusal(response: Response): Promise<RequestError> {
  const parsed = apiErrorSchema.safeParse(await response.json().catch(() => null));
  if (!parsed.success) {
    return new RequestError(
      response.status >= 500 ? 'unavailable' : 'internal',
      `The server answered ${response.status} without a reason. Try again in a moment.`,
    );
  }
  const { error, current } = parsed.data;
  return new RequestError(error.code, error.message, current);
}

/**
 * Fetches JSON and parses it with the route's own schema; null for an answer without a body.
 * @throws RequestError
 */
export async function request<T extends z.ZodType>(
  schema: T,
  path: string,
  options: { method?: 'GET' | 'POST' | 'PUT'; body?: unknown } = {},
): Promise<z.output<T>> {
  const response = await send(path, options);
  const parsed = schema.safeParse(await response.json().catch(() => null));
  if (!parsed.success) {
    throw new RequestError(
      'internal',
      'The server sent an answer this screen cannot read. Reload the page.',
    );
  }
  return parsed.data;
}

/** The same for a request whose answer holds nothing of interest. @throws RequestError */
export async function send(
  path: string,
  options: { method?: 'GET' | 'POST' | 'PUT' | 'DELETE'; body?: unknown } = {},
): Promise<Response> {
  let response: Response;
  try {
    response = await fetch(path, {
      method: options.method ?? 'GET',
      ...(options.body instanceof FormData
        ? { body: options.body }
        : options.body !== undefined && {
            headers: { 'content-type': 'application/json' },
            body: JSON.stringify(options.body),
          }),
    });
  } catch {
    throw new RequestError('offline', 'The server could not be reached.');
  }
  if (!response.ok) throw await refusal(response);
  return response;
}
