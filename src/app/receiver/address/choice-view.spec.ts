import { convertToParamMap } from '@angular/router';

import { choiceParams, type ChoiceView, readChoiceView } from './choice-view';

describe('the address of the choice of IF', () => {
  it.each<ChoiceView>([
    {
      window: [540_000, 575_500],
      sort: { active: 'image', direction: 'desc' },
      date: '2026-12-21',
    },
    { window: null, sort: null, date: null },
  ])('reads back what it writes', (view) => {
    const said = Object.entries(choiceParams(view)).flatMap(([key, value]) =>
      value === null ? [] : [[key, String(value)]],
    );

    expect(readChoiceView(convertToParamMap(Object.fromEntries(said)))).toEqual(view);
  });

  it('reads nonsense as not said', () => {
    const params = convertToParamMap({ view: '600-500', sort: 'image', date: '2026-13-41' });

    expect(readChoiceView(params)).toEqual({ window: null, sort: null, date: null });
  });
});
