import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, signal, type Type } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatDialogHarness } from '@angular/material/dialog/testing';
import { MatInputHarness } from '@angular/material/input/testing';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';

import type { Role } from '../../../shared/contracts/session';
import type { FakeServer } from '../core/fake-server';
import { Session } from '../core/session/session';
import { CorrectionStore } from './correction-store';
import { EditionStore } from './edition-store';

@Component({ template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Elsewhere {}

/** What a page stands under, its address, and who looks at it. */
interface Visit {
  readonly path: string;
  readonly url: string;
  readonly role?: Role;
}

/** Opens a page of the feature; for specs. */
export async function openPage<T>(
  component: Type<T>,
  server: FakeServer,
  { path, url, role = 'librarian' }: Visit,
) {
  TestBed.configureTestingModule({
    providers: [
      CorrectionStore,
      EditionStore,
      provideHttpClient(withInterceptors([server.intercept])),
      { provide: Session, useValue: { user: signal({ id: 1, workshop: { role } }) } },
      provideRouter(
        [
          { path, component },
          { path: '**', component: Elsewhere },
        ],
        withComponentInputBinding(),
      ),
    ],
  });
  const { fixture } = await RouterTestingHarness.create(url);
  return handlesOf(fixture);
}

const TRIES = 100;
const PAUSE_MS = 20;

/** What a person does with a page, and sees of it. */
function handlesOf(fixture: ComponentFixture<unknown>) {
  const loader = TestbedHarnessEnvironment.documentRootLoader(fixture);
  const element = fixture.nativeElement as HTMLElement;
  const input = (label: string) => loader.getHarness(MatInputHarness.with({ label }));
  const until = async (isSo: () => boolean | Promise<boolean>): Promise<void> => {
    await fixture.whenStable();
    for (let tries = 0; tries < TRIES && !(await isSo()); tries++) {
      await new Promise((resolve) => setTimeout(resolve, PAUSE_MS));
      await fixture.whenStable();
    }
  };
  return {
    loader,
    element,
    /** Texts of what a selector finds once all of it is there, white space made plain. */
    texts: async (selector: string): Promise<string[]> => {
      const isThere = () => element.querySelector('h1, app-problem-note') !== null;
      await until(() => isThere() && element.querySelector('app-loading') === null);
      return [...element.querySelectorAll(selector)].map(({ textContent }) =>
        textContent.replace(/\s+/g, ' ').trim(),
      );
    },
    press: async (text: string | RegExp) =>
      (await loader.getHarness(MatButtonHarness.with({ text }))).click(),
    type: async (label: string, text: string) => (await input(label)).setValue(text),
    valueOf: async (label: string) => (await input(label)).getValue(),
    /** Answers the question that was asked. */
    answer: async (text: string) => {
      const dialog = await loader.getHarness(MatDialogHarness);
      await (await dialog.getHarness(MatButtonHarness.with({ text }))).click();
      await until(async () => (await loader.getAllHarnesses(MatDialogHarness)).length === 0);
    },
    address: () => TestBed.inject(Router).url,
  };
}
