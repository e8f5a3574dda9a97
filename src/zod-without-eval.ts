import * as z from 'zod';

// The content security policy forbids compiling code at run time, which zod tries as soon as a
// schema is made. This stands in a bundle of its own that runs before the application.
z.config({ jitless: true });
