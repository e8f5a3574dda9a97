import { ComponentHarness } from '@angular/cdk/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { provideHttpClient, withInterceptors } from '@angular/common/http';
import { type Type } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatChipListboxHarness } from '@angular/material/chips/testing';
import { MatDialogHarness } from '@angular/material/dialog/testing';
import { MatInputHarness } from '@angular/material/input/testing';
import { provideRouter, Router } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';

import { ReceiverPage } from './receiver-page';
import { benchServer } from './section-sample';

/** A section of a receiver as its reader meets it. */
export class SectionHarness extends ComponentHarness {
  static readonly hostSelector = 'app-receiver-page';

  private readonly alerts = this.locatorForAll('[role="alert"]');
  private readonly rows = this.locatorForAll('app-response-table tbody tr');
  private readonly items = this.locatorForAll('li');
  private readonly pointer = this.locatorFor('app-dial-pointer');

  async text(): Promise<string> {
    return (await this.host()).text();
  }

  async alertTexts(): Promise<string[]> {
    const texts = await Promise.all((await this.alerts()).map((each) => each.text()));
    return texts.filter((text) => text !== '');
  }

  async rowTexts(): Promise<string[]> {
    return Promise.all((await this.rows()).map((each) => each.text()));
  }

  async itemTexts(): Promise<string[]> {
    return Promise.all((await this.items()).map((each) => each.text()));
  }

  async dialPointer() {
    return this.pointer();
  }

  async press(text: string | RegExp): Promise<void> {
    await (await this.locatorFor(MatButtonHarness.with({ text }))()).click();
  }

  async type(label: string | RegExp, text: string): Promise<void> {
    const field = await this.fieldOf(label);
    await field.setValue(text);
    await (await field.host()).dispatchEvent('change');
  }

  async typed(label: string | RegExp): Promise<string> {
    return (await this.fieldOf(label)).getValue();
  }

  /** A limit of the stretch that the first chart shows, by its label. */
  async limit(label: 'From' | 'to'): Promise<string> {
    const [from, to] = await this.locatorForAll('app-chart-head .limits input')();
    const field = label === 'From' ? from : to;
    return (await field?.getProperty<string>('value')) ?? '';
  }

  async chips(label: string): Promise<MatChipListboxHarness> {
    const selector = `[aria-label="${label}"]`;
    return this.locatorFor(MatChipListboxHarness.with({ selector }))();
  }

  private async fieldOf(label: string | RegExp): Promise<MatInputHarness> {
    return this.locatorFor(MatInputHarness.with({ label }))();
  }
}

/** Opens a section at an address of receiver 1, and waits until what it asks is answered. */
export async function openSection(section: Type<unknown>, query = '', server = benchServer()) {
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(withInterceptors([server.intercept])),
      provideRouter([
        {
          path: 'receivers/:id',
          component: ReceiverPage,
          children: [{ path: 'section', component: section }],
        },
      ]),
    ],
  });
  const address = `/receivers/1/section?site=4&edition=7${query}`;
  const { fixture } = await RouterTestingHarness.create(address);
  const loader = TestbedHarnessEnvironment.loader(fixture);
  const root = TestbedHarnessEnvironment.documentRootLoader(fixture);
  const settle = async (ms = 200) => {
    await new Promise((resolve) => setTimeout(resolve, ms));
    await fixture.whenStable();
  };
  // The pointer is asked about once the set is judged: two questions, each with its pause.
  await settle(800);
  return {
    page: await loader.getHarness(SectionHarness),
    server,
    settle,
    dialogs: () => root.getAllHarnesses(MatDialogHarness),
    query: () => TestBed.inject(Router).parseUrl(TestBed.inject(Router).url).queryParams,
    go: (url: string) => TestBed.inject(Router).navigateByUrl(url),
  };
}
