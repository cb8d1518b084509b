import { type HttpInterceptorFn } from '@angular/common/http';
import { inject } from '@angular/core';
import { Router } from '@angular/router';
import { catchError, throwError } from 'rxjs';

import { problemFrom } from './problem';

/** Every failed request fails with a Problem; one that asks to sign in leads there and back. */
export const problemInterceptor: HttpInterceptorFn = (request, next) => {
  const router = inject(Router);
  return next(request).pipe(
    catchError((error: unknown) => {
      const problem = problemFrom(error);
      const asksToSignIn = problem.status === 401 && !request.url.endsWith('/api/session');
      if (asksToSignIn && !router.url.startsWith('/sign-in')) {
        void router.navigate(['/sign-in'], { queryParams: { then: router.url } });
      }
      return throwError(() => problem);
    }),
  );
};
