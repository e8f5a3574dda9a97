import { NgTemplateOutlet } from '@angular/common';
import {
  ApplicationRef,
  ChangeDetectionStrategy,
  Component,
  computed,
  contentChild,
  ElementRef,
  inject,
  input,
  model,
  signal,
  TemplateRef,
} from '@angular/core';

import { ChartHead } from '../chart-head/chart-head';
import { ExportMenu } from '../export/export-menu';
import { type ChartTable, TwinTable } from '../twin-table/twin-table';
import { type WholeScale, type Window } from '../zoom-window';
import { ChartOrigin } from './chart-origin';
import { Printing } from './printing';

/**
 * What every chart stands in: its name and sentence, zoom, the same rows as a table, what saves,
 * copies and prints it. The drawing is given as a template with an `app-plot` (or another `.surface`) in it:
 *
 *     <app-chart heading="…" description="…" [table]="table" [(picked)]="picked">
 *       <ng-template><app-plot …>…</app-plot></ng-template>
 *     </app-chart>
 */
@Component({
  selector: 'app-chart',
  templateUrl: './chart.html',
  styleUrl: './chart.scss',
  imports: [ChartHead, ExportMenu, NgTemplateOutlet, TwinTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Chart {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
  private readonly application = inject(ApplicationRef);
  private readonly origin = inject(ChartOrigin, { optional: true });
  protected readonly printing = inject(Printing);

  readonly heading = input.required<string>();
  /** A sentence with the chart's own numbers. */
  readonly description = input.required<string>();
  /** The chart's rows, made when they are wanted: drawing does not wait for them. */
  readonly table = input.required<() => ChartTable>();
  /** What is drawn is being replaced: said in place of the description, and nothing is saved. */
  readonly awaited = input<string | null>(null);
  /** Scale over the whole range; null: the chart does not zoom. */
  readonly wholeScale = input<WholeScale | null>(null);
  readonly window = model<Window | null>(null);
  readonly picked = model<string | null>(null);
  readonly isTable = model(false);

  protected readonly drawing = contentChild.required(TemplateRef);
  /** The drawing is wanted although the table is shown. */
  private readonly isWanted = signal(false);
  protected readonly isDrawn = computed(
    () => !this.isTable() || this.printing.isOn() || this.isWanted(),
  );
  protected readonly isListed = computed(() => this.isTable() || this.printing.isOn());
  protected readonly facts = computed(() => [
    ...(this.origin?.facts() ?? []),
    { label: $localize`Printed`, value: new Date().toISOString().slice(0, 10) },
  ]);

  /** Hands the drawing to what saves it, also while the table stands in its place. */
  protected readonly picture = <T>(take: (svg: SVGSVGElement) => T): T | undefined => {
    this.isWanted.set(true);
    this.application.tick();
    const svg = this.host.querySelector<SVGSVGElement>('.surface svg');
    const taken = svg ? take(svg) : undefined;
    this.isWanted.set(false);
    return taken;
  };
}
