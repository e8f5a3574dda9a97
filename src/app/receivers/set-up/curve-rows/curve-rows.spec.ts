import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatInputHarness } from '@angular/material/input/testing';

import { selectivityControls } from '../receiver-form/selectivity-controls';
import { CurveRows } from './curve-rows';

async function arrange() {
  const form = selectivityControls();
  form.controls.kind.setValue('table');
  const fixture = TestBed.createComponent(CurveRows);
  fixture.componentRef.setInput('points', form.controls.points);
  const loader = TestbedHarnessEnvironment.loader(fixture);
  const host = fixture.nativeElement as HTMLElement;
  await fixture.whenStable();
  const paste = async (text: string) => {
    const event = new Event('paste', { bubbles: true, cancelable: true });
    Object.assign(event, { clipboardData: { getData: () => text } });
    host.querySelector('input')?.dispatchEvent(event);
    await fixture.whenStable();
    return event.defaultPrevented;
  };
  const said = () => host.querySelector('[role=status]')?.textContent.trim() ?? null;
  return { form, loader, paste, said };
}

describe('a measured curve', () => {
  it('is edited row by row', async () => {
    const { form, loader } = await arrange();
    const add = await loader.getHarness(MatButtonHarness.with({ text: 'Add a point' }));
    await add.click();

    const inputs = await loader.getAllHarnesses(MatInputHarness);
    expect(inputs).toHaveLength(6);
    await inputs[2]?.setValue('4.5');
    await inputs[3]?.setValue('20');
    const last = await loader.getHarness(MatButtonHarness.with({ text: /Remove point 3/u }));
    await last.click();

    expect(form.controls.points.value).toEqual([
      { offsetHz: 0, rejectionDb: 0 },
      { offsetHz: 4500, rejectionDb: 20 },
    ]);
    expect(form.dirty).toBe(true);
    const fewest = await loader.getHarness(MatButtonHarness.with({ text: /Remove point 1/u }));
    expect(await fewest.isDisabled()).toBe(true);
  });

  it('is pasted from a spreadsheet in place of what was there', async () => {
    const { form, loader, paste, said } = await arrange();

    expect(await paste('kHz\tdB\n0\t0\n2,5\t3\n5\t21\nbeyond\t?\n10\t60')).toBe(true);

    expect(form.controls.points.value.map(({ offsetHz }) => offsetHz)).toEqual([
      0, 2500, 5000, 10_000,
    ]);
    expect(await loader.getAllHarnesses(MatInputHarness)).toHaveLength(8);
    expect(said()).toBe('4 points were pasted. Not understood: line 5.');
    expect(form.dirty).toBe(true);
  });

  it('leaves alone what is pasted into one field, and a table without points', async () => {
    const { form, paste, said } = await arrange();

    expect(await paste('4.5')).toBe(false);
    expect(said()).toBeNull();
    expect(await paste('one\ttwo\nthree\tfour')).toBe(true);
    expect(said()).toContain('0 points were read, and nothing was changed');
    expect(form.controls.points).toHaveLength(2);
  });
});
