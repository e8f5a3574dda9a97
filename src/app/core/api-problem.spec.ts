import { HttpErrorResponse } from '@angular/common/http';

import { toProblem } from './api-problem';

describe('toProblem', () => {
  it('reads the problem the server sent', () => {
    const sent = { type: 'x', title: 'Give the IF.', status: 400, instance: 'abc' };
    const error = new HttpErrorResponse({ status: 400, error: sent });

    expect(toProblem(error)).toEqual(sent);
  });

  it('reads the failure a resource wraps', () => {
    const sent = { type: 'x', title: 'Gone.', status: 404, instance: 'abc' };
    const cause = new HttpErrorResponse({ status: 404, error: sent });

    expect(toProblem(new Error('wrapped', { cause }))).toEqual(sent);
  });

  it('says that the server does not answer', () => {
    expect(toProblem(new HttpErrorResponse({ status: 0 })).type).toBe('server-unreachable');
  });

  it('names the status of an answer that explains nothing', () => {
    const { title } = toProblem(new HttpErrorResponse({ status: 502, error: '<html>' }));

    expect(title).toContain('502');
  });

  it('takes anything else for an answer that cannot be read', () => {
    expect(toProblem(new TypeError('undefined is not a function')).type).toBe('answer-unreadable');
  });
});
