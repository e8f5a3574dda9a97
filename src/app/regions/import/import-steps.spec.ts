import { isOpen, stepFor, STEPS } from './import-steps';

describe('stepFor', () => {
  it.each([
    [undefined, 'file'],
    ['uploaded', 'columns'],
    ['checking', 'columns'],
    ['ready', 'check'],
    ['failed', 'store'],
    ['committing', 'store'],
    ['committed', 'result'],
    ['cancelled', 'result'],
    ['undone', 'result'],
  ] as const)('goes on from %s with the step %s', (state, step) => {
    expect(stepFor(undefined, state)).toBe(step);
  });

  it('goes back to a step that is still open', () => {
    expect(stepFor('columns', 'ready')).toBe('columns');
    expect(stepFor('store', 'ready')).toBe('store');
  });

  it('never opens a step that comes too early, too late or does not exist', () => {
    expect(stepFor('store', 'uploaded')).toBe('columns');
    expect(stepFor('columns', 'committed')).toBe('result');
    expect(stepFor('nonsense', 'ready')).toBe('check');
    expect(stepFor('result', undefined)).toBe('file');
  });
});

describe('isOpen', () => {
  it('closes every earlier step while the list is being stored', () => {
    expect(STEPS.filter((step) => isOpen(step, 'committing'))).toEqual(['store']);
  });

  it('leaves only the file before there is an import', () => {
    expect(STEPS.filter((step) => isOpen(step, undefined))).toEqual(['file']);
  });
});
