import { z } from 'zod';

/** How a dial is asked for, as a query. mm, rad */
export const dialQuerySchema = z.object({
  section: z.coerce.number().int().min(0).max(3),
  quantity: z.enum(['frequency', 'wavelength', 'capacitance']),
  form: z.enum(['round', 'straight']),
  moves: z.enum(['pointer', 'scale']),
  radius: z.coerce.number(),
  ratio: z.coerce.number(),
  drum: z.coerce.number(),
  sense: z.enum(['clockwise', 'anticlockwise']),
  place: z.enum(['upper', 'lower', 'open']),
  open: z.coerce.number(),
  hole: z.coerce.number(),
  title: z.string().max(40).default(''),
});
