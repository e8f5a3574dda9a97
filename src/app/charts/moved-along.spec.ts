import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ComponentHarness, TestKey } from '@angular/cdk/testing';
import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { scaleLinear } from 'd3';

import { DialPointer } from './band-strip/dial-pointer';
import { frame } from './frame';

@Component({
  imports: [DialPointer],
  template: `
    <app-dial-pointer
      [dial]="'Medium wave'"
      [scale]="scale"
      [frame]="frame"
      [limits]="limits"
      [(dialHz)]="hz"
      (settled)="settled.set(settled() + 1)"
    />
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Page {
  readonly limits = { low: 500_000, high: 1_500_000 };
  readonly frame = frame(1036, 200, { top: 0, right: 0, bottom: 0, left: 36 });
  readonly scale = scaleLinear([500_000, 1_500_000], [0, 1000]);
  readonly hz = signal(600_000);
  readonly settled = signal(0);
}

class PointerHarness extends ComponentHarness {
  static readonly hostSelector = 'app-dial-pointer';
}

async function open() {
  const fixture = TestBed.createComponent(Page);
  const loader = TestbedHarnessEnvironment.loader(fixture);
  const pointer = await (await loader.getHarness(PointerHarness)).host();
  const element = (fixture.nativeElement as HTMLElement).querySelector('app-dial-pointer');
  if (!(element instanceof HTMLElement)) throw new Error('There is no pointer.');
  element.setPointerCapture = () => undefined;
  const drag = (type: string, clientX: number, button = 0) =>
    element.dispatchEvent(new PointerEvent(type, { clientX, button, pointerId: 1 }));
  return { page: fixture.componentInstance, pointer, drag };
}

describe('a marker that is moved along a chart', () => {
  it('stays under the finger that took hold of it beside its middle', async () => {
    const { page, drag } = await open();

    drag('pointerdown', 145);
    drag('pointermove', 245.04);
    expect(page.hz()).toBe(700_000);
    expect(page.settled()).toBe(0);
    drag('lostpointercapture', 245);
    drag('pointermove', 400);

    expect(page.hz()).toBe(700_000);
    expect(page.settled()).toBe(1);
  });

  it('is not taken hold of by another button, and does not leave its limits', async () => {
    const { page, drag } = await open();

    drag('pointerdown', 140, 2);
    drag('pointermove', 240);
    expect(page.hz()).toBe(600_000);
    drag('pointerdown', 140);
    drag('pointermove', -5000);
    expect(page.hz()).toBe(500_000);
  });

  it('goes by keys, finer with Shift, farther with the page keys, and to the ends', async () => {
    const { page, pointer } = await open();

    await pointer.sendKeys(TestKey.UP_ARROW);
    expect(page.hz()).toBe(601_000);
    await pointer.sendKeys({ shift: true }, TestKey.LEFT_ARROW);
    expect(page.hz()).toBe(600_900);
    await pointer.sendKeys(TestKey.PAGE_UP);
    expect(page.hz()).toBe(610_900);
    await pointer.sendKeys(TestKey.HOME);
    expect(page.hz()).toBe(500_000);
    const settled = page.settled();
    await pointer.sendKeys('x');
    expect(page.settled()).toBe(settled);
  });

  it('says its value with its unit', async () => {
    const { pointer } = await open();

    expect(await pointer.getAttribute('aria-valuetext')).toMatch(/^600\skHz$/);
    expect(await pointer.getAttribute('aria-label')).toBe('Pointer of the dial, Medium wave');
    expect(await pointer.text()).toBe('600');
  });
});
