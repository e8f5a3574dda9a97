import { Clipboard } from '@angular/cdk/clipboard';
import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatMenuModule } from '@angular/material/menu';

import { Icon } from '../../ui/icon/icon';
import { ChartOrigin } from '../chart/chart-origin';
import type { ChartTable } from '../twin-table/twin-table';
import { embeddedFonts } from './embedded-fonts';
import { fileName } from './file-name';
import { type Picture, pictureText, standalonePicture } from './picture';
import { pictureAsPng } from './raster';
import { saveFile } from './save-file';
import { tableAsCsv, tableAsTabs } from './table-text';

const SVG = 'http://www.w3.org/2000/svg';

/** Gives a chart's drawing to a function; undefined: there is none. */
export type TakePicture = <T>(take: (svg: SVGSVGElement) => T) => T | undefined;

/** Saves a chart as picture or rows, copies its rows, prints it. */
@Component({
  selector: 'app-export-menu',
  templateUrl: './export-menu.html',
  styles: `
    .done {
      color: var(--fallow-quiet);
      font-size: 0.875rem;
    }
  `,
  imports: [Icon, MatButtonModule, MatMenuModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ExportMenu {
  private readonly clipboard = inject(Clipboard);
  private readonly origin = inject(ChartOrigin, { optional: true });

  readonly heading = input.required<string>();
  readonly description = input.required<string>();
  readonly table = input.required<() => ChartTable>();
  readonly picture = input.required<TakePicture>();

  /** What is drawn is being replaced: it waits. */
  readonly isAwaited = input(false);

  protected readonly done = signal('');

  protected async saveSvg(): Promise<void> {
    const picture = await this.wholePicture();
    if (picture) this.save(pictureText(picture), 'image/svg+xml', 'svg');
  }

  protected async savePng(): Promise<void> {
    const picture = await this.wholePicture();
    if (picture) this.save(await pictureAsPng(picture), 'image/png', 'png');
  }

  protected saveCsv(): void {
    // The mark at the front tells spreadsheets that the text is UTF-8.
    this.save(`\uFEFF${tableAsCsv(this.table()(), this.facts())}\n`, 'text/csv', 'csv');
  }

  protected copy(): void {
    const isCopied = this.clipboard.copy(tableAsTabs(this.table()()));
    this.done.set(isCopied ? $localize`Copied` : $localize`The browser did not let it be copied.`);
  }

  protected print(): void {
    // The menu is gone from the page before it is printed.
    setTimeout(() => {
      window.print();
    });
  }

  private async wholePicture(): Promise<Picture | undefined> {
    const words = {
      heading: this.heading(),
      description: this.description(),
      facts: this.facts(),
    };
    const picture = this.picture()((svg) => standalonePicture(svg, words));
    if (!picture) return undefined;
    const style = document.createElementNS(SVG, 'style');
    style.textContent = await embeddedFonts(picture.svg.textContent);
    picture.svg.prepend(style);
    return picture;
  }

  private save(content: BlobPart, type: string, ending: string): void {
    saveFile(new Blob([content], { type }), fileName(this.heading(), this.facts(), ending));
    this.done.set('');
  }

  private readonly facts = () => this.origin?.facts() ?? [];
}
