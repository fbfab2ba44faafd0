import { z } from 'zod';
import { checkDesign, KernelError, type Design } from '@/geometry';

/**
 * A design in JSON. The kernel's own check against the parameter table does the work, so bounds
 * and messages are the same in the form, the routes and the command line.
 */
export const designSchema = z.unknown().transform((input, context): Design => {
  try {
    return checkDesign(input);
  } catch (error) {
    if (!(error instanceof KernelError)) throw error;
    context.addIssue({ code: 'custom', message: error.message, path: error.path.split('.') });
    return z.NEVER;
  }
});
