import { one } from './one';

export const two = (): number => (Number.isNaN(one()) ? 0 : 1);
