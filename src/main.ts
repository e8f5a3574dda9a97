import { bootstrapApplication } from '@angular/platform-browser';
import * as z from 'zod';

import { App } from './app/app';
import { appConfig } from './app/app.config';

// The content security policy forbids compiling code at run time, which zod would try.
z.config({ jitless: true });

bootstrapApplication(App, appConfig).catch((error: unknown) => {
  console.error(error);
});
