import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';

import type { FormIssue } from './form-issues';
import { FormProblems } from './form-problems';
import { FormProblemsHarness } from './form-problems-harness';

@Component({
  imports: [FormProblems],
  template: `
    <app-form-problems [issues]="issues()" (follow)="followed.set($event)" />
    <input id="bands.0.lowHz" i18n-aria-label aria-label="From" />
    <div id="bands.1"><button type="button" i18n>Remove</button></div>
  `,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Page {
  readonly issues = signal<readonly FormIssue[]>([]);
  readonly followed = signal('');
}

async function arrange(...issues: FormIssue[]) {
  const fixture = TestBed.createComponent(Page);
  document.body.append(fixture.nativeElement as Node);
  fixture.componentInstance.issues.set(issues);
  await fixture.whenStable();
  const loader = TestbedHarnessEnvironment.loader(fixture);
  return { page: fixture.componentInstance, harness: await loader.getHarness(FormProblemsHarness) };
}

describe('the summary of a form’s problems', () => {
  it('is not there while nothing is wrong', async () => {
    const { harness } = await arrange();

    expect(await harness.messages()).toEqual([]);
  });

  it('takes the focus and counts', async () => {
    const { harness } = await arrange(
      { path: 'bands.0.lowHz', message: 'Give a start.' },
      { path: '', message: 'Try later.' },
    );

    expect(await harness.isFocused()).toBe(true);
    expect(await harness.title()).toBe('2 things need mending');
    expect(await harness.messages()).toEqual(['Give a start.', 'Try later.']);
  });

  it('leads to the field, and says so first', async () => {
    const { page, harness } = await arrange({ path: 'bands.0.lowHz', message: 'Give a start.' });

    await harness.follow('Give a start.');

    expect(page.followed()).toBe('bands.0.lowHz');
    expect(document.activeElement?.id).toBe('bands.0.lowHz');
  });

  it('leads to what a field without a place of its own is a part of', async () => {
    const { harness } = await arrange({ path: 'bands.1.tracking', message: 'Not like that.' });

    await harness.follow('Not like that.');

    expect(document.activeElement?.textContent).toBe('Remove');
  });
});
