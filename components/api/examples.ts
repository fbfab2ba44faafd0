import './zod-setup';
import * as z from 'zod';
import { designSchema } from '@/lib/schemas/design';
import { request } from './request';

const indexSchema = z.array(
  z.object({ file: z.string(), name: z.string(), description: z.string() }),
);
export type ExampleEntry = z.infer<typeof indexSchema>[number];

const exampleSchema = z.object({
  name: z.string(),
  description: z.string(),
  design: designSchema,
});

/** Worked designs that come with the product. */
export const fetchExamples = () => request(indexSchema, '/examples/index.json');

export const fetchExample = (file: string) => request(exampleSchema, `/examples/${file}`);
