import { ChangeDetectionStrategy, Component, computed, input, model, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatMenuModule } from '@angular/material/menu';

import { Icon } from '../../ui/icon/icon';
import { formatPlace, parsePlace } from '../../ui/place/place';
import { formatQuantity, parseQuantity } from '../../ui/quantity/quantity';
import { type Frame, NARROW } from '../frame';
import { closer, moved, moves } from './map-moves';
import { fittedView, type MapPlane, type MapView } from './map-plane';

/** Buttons and typed limits that move and zoom a map, as dragging does; on a phone in a menu. */
@Component({
  selector: 'app-map-tools',
  imports: [Icon, MatButtonModule, MatMenuModule],
  templateUrl: './map-tools.html',
  styleUrl: './map-tools.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MapTools {
  readonly plane = input.required<MapPlane>();
  readonly frame = input.required<Frame>();
  readonly whole = input.required<MapView>();
  readonly view = model.required<MapView>();

  protected readonly directions = [
    { key: 'ArrowLeft', icon: 'back', name: $localize`Move the map to the left` },
    { key: 'ArrowUp', icon: 'up', name: $localize`Move the map up` },
    { key: 'ArrowDown', icon: 'down', name: $localize`Move the map down` },
    { key: 'ArrowRight', icon: 'forward', name: $localize`Move the map to the right` },
  ] as const;
  protected readonly isNarrow = computed(() => this.frame().width < NARROW);
  /** Whether the limits are shown where there is little room. */
  protected readonly isTyping = signal(false);
  protected readonly middle = computed(() => {
    const { latitude, longitude } = this.plane().invert(this.view());
    return formatPlace(Number(latitude.toFixed(2)), Number(longitude.toFixed(2)));
  });
  protected readonly across = computed(() =>
    formatQuantity(Number((1000 * this.view().acrossKm).toPrecision(3)), 'distance'),
  );
  protected readonly isWhole = computed(() => {
    const [view, whole] = [this.view(), this.whole()];
    return view.x === whole.x && view.y === whole.y && view.acrossKm === whole.acrossKm;
  });

  protected move(key: string): void {
    const step = moves[key];
    if (step) this.view.set(moved(this.view(), step, this.frame()));
  }

  protected zoom(steps: number): void {
    this.view.set(closer(this.view(), steps, this.frame()));
  }

  /** Takes a middle as typed; what cannot be read goes back to what was shown. */
  protected goTo(box: HTMLInputElement): void {
    const reading = parsePlace(box.value);
    if ('place' in reading && reading.place) {
      this.show({ ...this.view(), ...this.plane().project(reading.place) });
    }
    box.value = this.middle();
  }

  protected span(box: HTMLInputElement): void {
    const reading = parseQuantity(box.value, 'distance');
    if ('value' in reading && reading.value !== null && reading.value > 0) {
      this.show({ ...this.view(), acrossKm: reading.value / 1000 });
    }
    box.value = this.across();
  }

  private show(view: MapView): void {
    this.view.set(fittedView(view, this.frame()));
  }
}
