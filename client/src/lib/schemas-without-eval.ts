import { config } from 'zod';

// zod would compile its schemas with `new Function`, which the content security policy of the pages forbids: it is told
// so before the first schema is made, and then does not try.
config({ jitless: true });
