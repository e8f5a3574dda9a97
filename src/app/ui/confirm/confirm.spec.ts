import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatDialogHarness } from '@angular/material/dialog/testing';

import { Confirm } from './confirm';

@Component({ template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Page {}

const question = { title: 'Delete it?', text: 'For good.', agree: 'Delete', decline: 'Keep' };

async function answered(button?: string): Promise<boolean> {
  const loader = TestbedHarnessEnvironment.documentRootLoader(TestBed.createComponent(Page));
  const answer = TestBed.inject(Confirm).ask(question);
  const dialog = await loader.getHarness(MatDialogHarness);
  if (button === undefined) await dialog.close();
  else await (await dialog.getHarness(MatButtonHarness.with({ text: button }))).click();
  return answer;
}

describe('a question', () => {
  it('is agreed to by its button alone', async () => {
    expect(await answered('Delete')).toBe(true);
  });

  it('is declined by the other', async () => {
    expect(await answered('Keep')).toBe(false);
  });

  it('is declined by Escape', async () => {
    expect(await answered()).toBe(false);
  });
});
