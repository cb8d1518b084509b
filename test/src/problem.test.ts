import { HttpErrorResponse } from '@angular/common/http';

import { problemFrom } from '../../src/app/http/problem';

it('keeps the words, the faults and the present state of a problem of the server', () => {
  const body = {
    type: '/problems/revision-conflict',
    title: 'Somebody saved meanwhile.',
    status: 412,
    detail: 'Nothing was overwritten.',
    errors: [{ pointer: '/document/keys/0', detail: 'is missing' }],
    current: { revision: 3 },
  };
  const problem = problemFrom(new HttpErrorResponse({ status: 412, error: body }));
  expect(problem).toMatchObject(body);
});

it('says that nothing was changed when the server cannot be reached', () => {
  const problem = problemFrom(new HttpErrorResponse({ status: 0 }));
  expect(problem.type).toBe('unreachable');
  expect(problem.detail).toContain('kept');
});

it('does not take a proxy page for a problem', () => {
  const problem = problemFrom(new HttpErrorResponse({ status: 502, error: '<html>Bad gateway</html>' }));
  expect(problem.type).toBe('unexpected');
  expect(problem.status).toBe(502);
});
