import { z } from 'zod';

/** The id of a row. */
export const idSchema = z.uuid();
