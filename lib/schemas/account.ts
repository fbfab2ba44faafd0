import { z } from 'zod';

/** Lower case, as it is stored: one address is one person. */
export const emailSchema = z
  .string()
  .trim()
  .toLowerCase()
  .max(254, 'Email: longer than 254 characters; use another')
  .pipe(z.email('Email: not an address; write it as name@workshop.example'));

export const passwordSchema = z
  .string()
  .min(12, 'Password: shorter than 12 characters; make it longer')
  .max(200, 'Password: longer than 200 characters; shorten it');

function nameOf(label: string) {
  return z
    .string()
    .trim()
    .min(1, `${label}: empty; fill it in`)
    .max(80, `${label}: longer than 80 characters; shorten it`)
    .refine(
      (text) => !/\p{Cc}/u.test(text),
      `${label}: holds control characters; type it again`,
    );
}

/** What makes a workshop with its owner. */
export const signUpSchema = z.object({
  workshop: nameOf('Workshop'),
  name: nameOf('Name'),
  email: emailSchema,
  password: passwordSchema,
});
export type SignUp = z.input<typeof signUpSchema>;
