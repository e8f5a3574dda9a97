import { fileName } from './file-name';

describe('the name of a saved file', () => {
  it('says which chart of what it is', () => {
    const facts = [
      { label: 'Receiver', value: 'Fennimore, IF 560' },
      { label: 'Site', value: 'Zelméré' },
    ];

    expect(fileName('Around the IF', facts, 'svg')).toBe(
      'around-the-if-fennimore-if-560-zelmere.svg',
    );
  });

  it('keeps other scripts, and stays short', () => {
    const facts = [{ label: 'Receiver', value: `Приёмник ${'x'.repeat(300)}` }];

    expect(fileName('The dial', facts, 'csv')).toMatch(/^the-dial-приемник-x{10,}\.csv$/);
    expect(fileName('The dial', facts, 'csv').length).toBeLessThan(120);
  });
});
