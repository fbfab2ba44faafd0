import type { ApiErrorCode, Current } from '@/lib/schemas/api';

/** A refusal by the server, or `offline` when it could not be reached at all. */
export class RequestError extends Error {
  readonly code: ApiErrorCode | 'offline';
  /** With `conflict`: what is stored now. */
  readonly current: Current | undefined;

  constructor(code: ApiErrorCode | 'offline', message: string, current?: Current) {
    super(message);
    this.name = 'RequestError';
    this.code = code;
    this.current = current;
  }

  /** Worth another try with the same body later. */
  get passing(): boolean {
    return this.code === 'offline' || this.code === 'unavailable';
  }
}
