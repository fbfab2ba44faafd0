import 'server-only';
import { availableParallelism } from 'node:os';
import { join } from 'node:path';
import { Piscina } from 'piscina';
import type { Derivation, Derived, Design } from '@/geometry';
import type { Machine } from '@/geometry/cutting/machine';
import type { CutPart } from '@/geometry/parts/part';
import { env } from '../env';
import { RequestError } from '../errors';
import { assessmentOf, describeFailure, findingsOf, type Assessment } from './assessment';
import type { FileNames } from './file-names';
import type { HashedFile } from './hashed-file';
import type { Task, Tasks } from './thread';

/**
 * The kernel on threads of its own: a design takes some tens of milliseconds, and whoever only
 * reads must not wait for them. Threads read the sources as they are, by tsx.
 */
function startThreads(): Piscina {
  const threads = env().KERNEL_THREADS ?? Math.max(1, availableParallelism() - 1);
  return new Piscina({
    filename: join(process.cwd(), 'lib', 'kernel', 'thread.ts'),
    execArgv: ['--import', 'tsx'],
    minThreads: threads,
    maxThreads: threads,
    idleTimeout: Infinity,
  });
}

// On globalThis, because Next loads this file once per bundle.
const store = globalThis as typeof globalThis & {
  vaneloftThreads?: Piscina;
  vaneloftDerivations?: Latest<Derivation>;
  vaneloftFiles?: Latest<HashedFile[]>;
  vaneloftCautions?: Latest<string[]>;
};

async function perform<Name extends keyof Tasks>(
  name: Name,
  ...args: Parameters<Tasks[Name]>
): Promise<Awaited<ReturnType<Tasks[Name]>>> {
  const task = { name, args } as Task;
  if (env().KERNEL_THREADS === 0) {
    const { default: here } = await import('./thread');
    return (await here(task)) as Awaited<ReturnType<Tasks[Name]>>;
  }
  store.vaneloftThreads ??= startThreads();
  return (await store.vaneloftThreads.run(task)) as Awaited<ReturnType<Tasks[Name]>>;
}

/** What was made last, so that a page, its list of files and a download share it. */
class Latest<T> {
  private static readonly KEPT = 64;
  private readonly made = new Map<string, Promise<T>>();

  get(key: string, make: () => Promise<T>): Promise<T> {
    const value = this.made.get(key) ?? make();
    // The longest unasked goes first.
    this.made.delete(key);
    this.made.set(key, value);
    value.catch(() => this.made.delete(key));
    if (this.made.size > Latest.KEPT) this.made.delete(this.made.keys().next().value!);
    return value;
  }
}

/** Starts the threads, so that the first who asks need not wait for that. */
export async function warmKernel(design: Design): Promise<void> {
  await deriveDesign(design);
}

/** What becomes of a design, with the whole field model. */
export function deriveDesign(design: Design): Promise<Derivation> {
  store.vaneloftDerivations ??= new Latest();
  return store.vaneloftDerivations.get(JSON.stringify(design), () => perform('derive', design));
}

/** The kernel's word on a design, for storing with it. */
export const assessDesign = async (design: Design): Promise<Assessment> =>
  assessmentOf(await deriveDesign(design));

/** The plates of a design. @throws RequestError checks-fail when it has none. */
export async function derivePlates(design: Design): Promise<Derived> {
  const derivation = await deriveDesign(design);
  if (derivation.ok) return derivation.derived;
  const failing = findingsOf(derivation).find(({ severity }) => severity === 'fail');
  throw new RequestError(
    'checks-fail',
    `This design has no plates to cut.${failing ? ` ${describeFailure(failing)}` : ''}`,
  );
}

/** Every file of these plates under these names. */
export function makeFiles(
  design: Design,
  derived: Derived,
  names: FileNames,
): Promise<HashedFile[]> {
  store.vaneloftFiles ??= new Latest();
  return store.vaneloftFiles.get(JSON.stringify([design, derived.kernel, names]), () =>
    perform('makeFiles', derived, names),
  );
}

/**
 * What a machine makes of parts. @param from names the parts for good, as a revision's id with
 * its sheet does
 */
export function machineCautions(
  from: string,
  parts: readonly CutPart[],
  machine: Machine,
): Promise<string[]> {
  store.vaneloftCautions ??= new Latest();
  return store.vaneloftCautions.get(JSON.stringify([from, machine]), () =>
    perform('machineCautions', parts, machine),
  );
}
