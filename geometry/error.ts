export type KernelErrorCode =
  'out-of-bounds' | 'not-a-number' | 'unknown-choice' | 'unknown-parameter' | 'section-count';

/**
 * Input that the kernel refuses. The message names the field, the value and what would work;
 * `path` locates the field in the design, as `sections.0.airGap`.
 */
export class KernelError extends Error {
  readonly code: KernelErrorCode;
  readonly path: string;
  readonly value: unknown;

  constructor(code: KernelErrorCode, path: string, value: unknown, message: string) {
    super(message);
    this.name = 'KernelError';
    this.code = code;
    this.path = path;
    this.value = value;
  }
}
