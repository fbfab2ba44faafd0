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

/** The secret part of a link from a mail. */
const secretSchema = z
  .string('Link: not whole; open it from the mail again')
  .min(1, 'Link: not whole; open it from the mail again')
  .max(200, 'Link: not one of ours; open it from the mail again');

/** What joins a workshop; a new person also sends `newPersonSchema`. */
export const joinSchema = z.object({ secret: secretSchema });

export const newPersonSchema = z.object({ name: nameOf('Name'), password: passwordSchema });

export const askResetSchema = z.object({ email: emailSchema });

export const resetSchema = z.object({ secret: secretSchema, password: passwordSchema });

export const ownNameSchema = z.object({ name: nameOf('Name') });

export const changePasswordSchema = z.object({
  current: z
    .string('Password now: empty; fill it in')
    .min(1, 'Password now: empty; fill it in')
    .max(200, 'Password now: not right; type it again'),
  password: passwordSchema,
});

export const newWorkshopSchema = z.object({ workshop: nameOf('Workshop') });

/** What mail tells of, as a member may choose; the entity's list is the same. */
export const mailChoiceSchema = z.enum([
  'released',
  'withdrawn',
  'ordered',
  'asked',
  'answered',
  'cut',
]);

export const chooseMailSchema = z.object({ muted: z.array(mailChoiceSchema).max(20) });

/** The workshops of one person, each with what they do not want mail about. */
export const ownWorkshopSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  role: z.enum(['owner', 'builder', 'machinist']),
  muted: z.array(mailChoiceSchema),
});
export type OwnWorkshop = z.infer<typeof ownWorkshopSchema>;
