import { expose } from 'comlink';
import { derive } from '@/geometry';

const kernel = { derive };

export type KernelWorker = typeof kernel;

expose(kernel);
