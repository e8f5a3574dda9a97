import { beginning, follow } from './trial-history';

const after = (...states: string[]) => states.reduce(follow<string>, beginning('a'));

describe('the history of a trial', () => {
  it('keeps states in their order', () => {
    expect(after('b', 'c')).toEqual({ states: ['a', 'b', 'c'], at: 2 });
  });

  it('knows a step back and forth again', () => {
    expect(after('b', 'c', 'b')).toEqual({ states: ['a', 'b', 'c'], at: 1 });
    expect(after('b', 'c', 'b', 'c')).toEqual({ states: ['a', 'b', 'c'], at: 2 });
  });

  it('forgets what could be redone when something new comes', () => {
    expect(after('b', 'c', 'b', 'd')).toEqual({ states: ['a', 'b', 'd'], at: 2 });
  });

  it('does not count a state twice', () => {
    expect(after('b', 'b')).toEqual({ states: ['a', 'b'], at: 1 });
  });
});
