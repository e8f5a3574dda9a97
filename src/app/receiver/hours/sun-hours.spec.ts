import { nightsOf } from './sun-hours';

describe('the nights of a day', () => {
  it('lie around midnight at Greenwich, in two pieces, shorter in summer', () => {
    const place = { latitude: 51.5, longitude: 0 };
    const [winter, summer] = ['2026-12-21', '2026-06-21'].map((date) => nightsOf(place, date));

    // Sunrise and sunset at Greenwich: common almanac times, 08:04 and 15:53; 03:43 and 20:21 UTC.
    expect(winter?.flat()).toEqual([0, 490, 960, 1440]);
    expect(summer?.flat()).toEqual([0, 230, 1230, 1440]);
  });

  it('are none under the midnight sun, and one beyond the circle in winter', () => {
    const place = { latitude: 78, longitude: 15 };

    expect(nightsOf(place, '2026-06-21')).toEqual([]);
    expect(nightsOf(place, '2026-12-21')).toEqual([[0, 1440]]);
  });
});
