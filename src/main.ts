import { bootstrapApplication } from '@angular/platform-browser';

import { App } from './app/app';
import { appConfig } from './app/app.config';
import { trustOwnScripts } from './app/own-scripts';

trustOwnScripts();

bootstrapApplication(App, appConfig).catch((error: unknown) => console.error(error));
