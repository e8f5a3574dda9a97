import { regionDraft } from '../../../shared/contracts/region';
import { formIssues } from '../ui/form-problems/form-issues';
import { addRange, fill, proposeRaster, regionForm, removeRange } from './region-form';

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
    expect(form.getRawValue().raster).toEqual(BY_9);

    form.patchValue({ ituRegion: 2 });
    proposeRaster(form);
    expect(form.getRawValue().raster).toEqual(BY_10);
  });

  it('leaves a raster that was entered by hand as it is', () => {
    const form = regionForm();
    form.patchValue({ ituRegion: 1 });
    proposeRaster(form);
    removeRange(form, 0);

    form.patchValue({ ituRegion: 2 });
    proposeRaster(form);

    expect(form.getRawValue().raster).toEqual(BY_9.slice(1));
  });

  it('names the limits that an empty range lacks', () => {
    const form = regionForm();
    form.patchValue({ name: 'Westmark', ituRegion: 3 });
    addRange(form);

    const issues = formIssues(form, regionDraft, form.getRawValue());

    expect(issues.map(({ path }) => path)).toEqual([
      'raster.0.lowHz',
      'raster.0.highHz',
      'raster.0.stepHz',
    ]);
  });

  it('objects to a range that is upside down', () => {
    const form = regionForm();
    const raster = [{ lowHz: 1_602_000, highHz: 531_000, stepHz: 9_000 }];
    fill(form, { name: 'Westmark', ituRegion: 1, raster });

    const issues = formIssues(form, regionDraft, form.getRawValue());

    expect(issues).toEqual([
      { path: 'raster.0.highHz', message: 'The raster must end at or above where it begins.' },
    ]);
  });
});
