import { provideHttpClient, withInterceptors } from '@angular/common/http';
import {
  type ApplicationConfig,
  inject,
  provideAppInitializer,
  provideBrowserGlobalErrorListeners,
  provideZonelessChangeDetection,
} from '@angular/core';
import { MAT_FORM_FIELD_DEFAULT_OPTIONS } from '@angular/material/form-field';
import { MAT_ICON_DEFAULT_OPTIONS, MatIconRegistry } from '@angular/material/icon';
import { DomSanitizer } from '@angular/platform-browser';
import { provideRouter, TitleStrategy, withComponentInputBinding, withRouterConfig } from '@angular/router';

import { Session } from './account/session';
import { routes } from './app.routes';
import { problemInterceptor } from './http/problem-interceptor';
import { registerIcons } from './ui/icons';
import { PageTitle } from './shell/page-title';

export const appConfig: ApplicationConfig = {
  providers: [
    provideZonelessChangeDetection(),
    provideBrowserGlobalErrorListeners(),
    provideRouter(
      routes,
      withComponentInputBinding(),
      withRouterConfig({ paramsInheritanceStrategy: 'always' }),
    ),
    // Not withFetch(): fetch tells nothing of an upload's progress.
    provideHttpClient(withInterceptors([problemInterceptor])),
    provideAppInitializer(() => {
      registerIcons(inject(MatIconRegistry), inject(DomSanitizer));
      return inject(Session).load();
    }),
    { provide: TitleStrategy, useClass: PageTitle },
    // In the filled look a dense field has no room for its label once it holds something.
    {
      provide: MAT_FORM_FIELD_DEFAULT_OPTIONS,
      useValue: { appearance: 'outline', subscriptSizing: 'dynamic' },
    },
    { provide: MAT_ICON_DEFAULT_OPTIONS, useValue: { fontSet: '' } },
  ],
};
