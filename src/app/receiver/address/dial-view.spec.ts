import { convertToParamMap } from '@angular/router';

import { dialParams, type DialView, readDialView } from './dial-view';

const view: DialView = {
  isLog: false,
  causes: ['image', 'half-if'],
  grades: ['annoying', 'very-annoying'],
  station: 'Ald',
  isHiddenShown: false,
  picked: 'response|1||1|1|612000|Medium wave',
  working: 'response|1||1|1|612000|Medium wave',
};

describe('the dial in the address', () => {
  it('comes back as it was', () => {
    expect(readDialView(convertToParamMap(dialParams(view)))).toEqual(view);
  });

  it('is short where nothing was chosen', () => {
    const bare = readDialView(convertToParamMap({}));

    expect(Object.values(dialParams(bare)).every((each) => each === null)).toBe(true);
    expect(bare).toMatchObject({ isLog: true, isHiddenShown: true, causes: [], grades: [] });
  });

  it('says only what changes', () => {
    expect(dialParams({ station: '' })).toEqual({ station: null });
  });

  it('passes over causes and grades there are not', () => {
    const read = readDialView(convertToParamMap({ cause: 'image,ghost', grade: 'loud' }));

    expect(read).toMatchObject({ causes: ['image'], grades: [] });
  });
});
