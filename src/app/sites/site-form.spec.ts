import { namedSite } from '../../../shared/contracts/site';
import { formIssues } from '../ui/form-problems/form-issues';
import { draftOf, fill, type SiteForm, siteForm, siteToSave } from './site-form';

const filled = (value: Parameters<SiteForm['patchValue']>[0]): SiteForm => {
  const form = siteForm();
  form.patchValue({ name: 'Signal Hill', ituRegion: 1, ...value });
  return form;
};

const issuesOf = (form: SiteForm) => formIssues(form, siteToSave, draftOf(form));

describe('siteForm', () => {
  it('becomes what the contract takes', () => {
    const form = filled({ latitude: '48° 12′ N', longitude: '16.4 W', noiseFloorDb: 12 });

    expect(issuesOf(form)).toEqual([]);
    expect(namedSite.parse(draftOf(form))).toEqual({
      name: 'Signal Hill',
      latitude: 48.2,
      longitude: -16.4,
      ground: 'average',
      noise: 'residential',
      indoors: false,
      noiseFloorDb: 12,
      ituRegion: 1,
    });
  });

  it.each([
    [{ latitude: '95', longitude: '16' }, 'latitude', 'between -90 and 90'],
    [{ latitude: '48', longitude: '-181' }, 'longitude', 'between -180 and 180'],
    [{ latitude: 'up there', longitude: '16' }, 'latitude', '48.2'],
    [{ latitude: '48', longitude: '' }, 'longitude', 'as well'],
    [{ latitude: '', longitude: '16' }, 'latitude', 'as well'],
    [{ name: ' ' }, 'name', 'Give a name'],
    [{ ituRegion: null }, 'ituRegion', '1, 2 or 3'],
    [{ noise: null }, 'noise', 'measured noise floor'],
    [{ noiseFloorDb: 900 }, 'noiseFloorDb', '300 dB'],
  ] as const)('with %o objects to %s', (value, path, message) => {
    const issues = issuesOf(filled(value));

    expect(issues).toHaveLength(1);
    expect(issues[0]).toEqual({ path, message: expect.stringContaining(message) as string });
  });

  it('shows a stored site so that saving it again changes nothing', () => {
    const stored = {
      id: 3,
      editable: true,
      name: 'Signal Hill',
      latitude: -33.9249,
      longitude: 18.4241,
      ground: 'sea',
      noise: null,
      indoors: true,
      noiseFloorDb: 20,
      ituRegion: 1,
    } as const;
    const form = siteForm();

    fill(form, stored);

    expect({ id: 3, editable: true, ...draftOf(form) }).toEqual(stored);
  });

  it('is closed to whoever may not change the site', () => {
    const form = siteForm();

    fill(form, { ...namedSite.parse(draftOf(filled({}))), id: 3, editable: false });

    expect(form.disabled).toBe(true);
  });
});
