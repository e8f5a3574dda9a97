import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterOutlet } from '@angular/router';

/** The frame around every page. */
@Component({
  selector: 'app-root',
  imports: [RouterOutlet],
  template: '<main id="content"><router-outlet /></main>',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class App {}
