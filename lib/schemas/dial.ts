import { z } from 'zod';

/** How a dial is asked for, as a query. mm */
export const dialQuerySchema = z.object({
  section: z.coerce.number().int().min(0).max(3),
  quantity: z.enum(['frequency', 'wavelength', 'capacitance']),
  form: z.enum(['round', 'straight']),
  radius: z.coerce.number(),
  ratio: z.coerce.number(),
  drum: z.coerce.number(),
  sense: z.enum(['clockwise', 'anticlockwise']),
  hole: z.coerce.number().min(0).max(100),
  title: z.string().max(40).default(''),
});
