import * as z from 'zod';

// The content security policy forbids the code that zod would otherwise generate. Imported before
// any schema is made, since that is when zod decides.
z.config({ jitless: true });
