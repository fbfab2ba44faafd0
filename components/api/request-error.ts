import type { ApiErrorCode, DesignRecord } from '@/lib/schemas/api';

/** A refusal by the server, or `offline` when it could not be reached at all. */
export class RequestError extends Error {
  readonly code: ApiErrorCode | 'offline';
  readonly current: DesignRecord | undefined;

  constructor(code: ApiErrorCode | 'offline', message: string, current?: DesignRecord) {
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
