/** Stored with everything derived. Raise it when the same design would give other plates. */
export const KERNEL_VERSION = '2.2.0';
