import { panelOf, panelsOf } from './panels';

describe('the panels of a set-up', () => {
  it.each([
    ['bands.2.circuits.0.qLow', 'circuits'],
    ['selectivity.b60Hz', 'selectivity'],
    ['strayDb.if', 'mixer'],
    ['trap.q', 'trap'],
    ['aerial.resonanceHz', 'aerial'],
    ['secondConversion.ifHz', 'second'],
    ['bands.1.tuningToleranceHz', 'bands'],
    ['bands.0.tracking.points.2', 'tracking'],
    ['selectivity.points.3.offsetHz', 'selectivity'],
    ['bands.2.lowHz', undefined],
    ['name', undefined],
  ])('hide %s in %s', (path, panel) => {
    expect(panelOf(path)).toBe(panel);
  });

  it('that hide something wrong are named', () => {
    const issues = ['ifHz', 'bfo.rangeHz', 'fixedFilter.widthHz'].map((path) => ({
      path,
      message: '',
    }));

    expect(panelsOf(issues)).toEqual(['bfo', 'filter']);
  });
});
