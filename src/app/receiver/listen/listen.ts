import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  signal,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatSliderModule } from '@angular/material/slider';

import { audibleBeats, type Beat } from '../../../../shared/radio/listen/audible-beats';
import { Icon } from '../../ui/icon/icon';
import { TonePlayer } from './tone-player';
import { toneWords } from './tone-words';

/** Lets an ear compare the beats of a dial setting with the set on the bench. Off until pressed. */
@Component({
  selector: 'app-listen',
  templateUrl: './listen.html',
  styleUrl: './listen.scss',
  imports: [Icon, MatButtonModule, MatSliderModule],
  providers: [TonePlayer],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Listen {
  protected readonly player = inject(TonePlayer);

  readonly beats = input.required<readonly Beat[]>();

  /** Percent. */
  protected readonly volume = signal(40);
  protected readonly tones = computed(() => audibleBeats(this.beats()));
  protected readonly words = computed(() => toneWords(this.tones()));

  constructor() {
    effect(() => {
      this.player.play(this.tones(), this.volume() / 100);
    });
  }

  protected toggle(): void {
    if (this.player.isOn()) this.player.stop();
    else this.player.start(this.tones(), this.volume() / 100);
  }
}
