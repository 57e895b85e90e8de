import { bootstrapApplication } from '@angular/platform-browser';
import { App } from './app/app';
import { appConfig } from './app/app.config';

bootstrapApplication(App, appConfig).catch((error: unknown) => {
  // the last resort: nothing of the product runs yet that could show it
  document.body.textContent = `Ligament could not start: ${String(error)}`;
});
