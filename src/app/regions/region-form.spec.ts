import { regionDraft } from '../../../shared/contracts/region';
import { formIssues } from '../ui/form-problems/form-issues';
import {
  addRange,
  addRaster,
  draftOf,
  fill,
  proposeRaster,
  regionForm,
  removeRange,
} from './region-form';

const BY_9 = [
  { lowHz: 153_000, highHz: 279_000, stepHz: 9_000 },
  { lowHz: 531_000, highHz: 1_602_000, stepHz: 9_000 },
];
const BY_10 = [{ lowHz: 540_000, highHz: 1_700_000, stepHz: 10_000 }];

describe('regionForm', () => {
  it('proposes the raster of the ITU Region and follows a change of it', () => {
    const form = regionForm();

    form.patchValue({ ituRegion: 1 });
    proposeRaster(form);
    expect(form.getRawValue().rasters).toEqual([{ from: '', ranges: BY_9 }]);

    form.patchValue({ ituRegion: 2 });
    proposeRaster(form);
    expect(form.getRawValue().rasters).toEqual([{ from: '', ranges: BY_10 }]);
  });

  it('leaves a raster that was entered by hand as it is', () => {
    const form = regionForm();
    form.patchValue({ ituRegion: 1 });
    proposeRaster(form);
    const [raster] = form.controls.rasters.controls;
    if (raster) removeRange(raster, 0);

    form.patchValue({ ituRegion: 2 });
    proposeRaster(form);

    expect(form.getRawValue().rasters).toEqual([{ from: '', ranges: BY_9.slice(1) }]);
  });

  it('says a raster without a day as one from ever', () => {
    const form = regionForm();
    form.patchValue({ name: 'Westmark', ituRegion: 1 });
    proposeRaster(form);
    addRaster(form, { from: '1978-11-23', ranges: BY_10 });

    expect(regionDraft.parse(draftOf(form)).rasters).toEqual([
      { from: null, ranges: BY_9 },
      { from: '1978-11-23', ranges: BY_10 },
    ]);
  });

  it('names the limits that an empty range lacks', () => {
    const form = regionForm();
    form.patchValue({ name: 'Westmark', ituRegion: 3 });
    addRaster(form);
    const [raster] = form.controls.rasters.controls;
    if (raster) addRange(raster);

    const issues = formIssues(form, regionDraft, draftOf(form));

    expect(issues.map(({ path }) => path)).toEqual(
      ['0', '1'].flatMap((range) =>
        ['lowHz', 'highHz', 'stepHz'].map((limit) => `rasters.0.ranges.${range}.${limit}`),
      ),
    );
  });

  it('objects to a range that is upside down, and to two rasters from one day', () => {
    const form = regionForm();
    const ranges = [{ lowHz: 1_602_000, highHz: 531_000, stepHz: 9_000 }];
    fill(form, { name: 'Westmark', ituRegion: 1, rasters: [{ from: '', ranges }] });

    expect(formIssues(form, regionDraft, draftOf(form))).toEqual([
      {
        path: 'rasters.0.ranges.0.highHz',
        message: 'The raster must end at or above where it begins.',
      },
    ]);

    const twice = [0, 1].map(() => ({ from: '1978-11-23', ranges: BY_9 }));
    fill(form, { name: 'Westmark', ituRegion: 1, rasters: twice });

    expect(formIssues(form, regionDraft, draftOf(form)).map(({ path }) => path)).toEqual([
      'rasters.1.from',
    ]);
  });
});
