import { config } from 'zod';

// zod would write itself faster checks as code from strings and tries out whether it may. The page's policy forbids
// that, and the attempt alone is reported as a violation. This runs before any page, and so before any schema, is loaded.
config({ jitless: true });
