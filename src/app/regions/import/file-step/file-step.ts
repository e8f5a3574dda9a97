import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { MatButtonModule } from '@angular/material/button';
import { MatProgressBarModule } from '@angular/material/progress-bar';
import { catchError, map, type Observable, of, startWith, Subject, switchMap, tap } from 'rxjs';

import type { Problem } from '../../../../../shared/contracts/problem';
import { toProblem } from '../../../core/api-problem';
import { Icon } from '../../../ui/icon/icon';
import { ProblemNote } from '../../../ui/page-state/problem-note';
import { ImportStore } from '../import-store';
import { StepHeading } from '../step-heading';

/** Names of columns that need no answer, and an invented station. */
const EXAMPLE = `name,frequency_khz,latitude,longitude,power_day_kw,power_night_kw
Ferry Point,612,47.31,8.05,50,10`;

/** What is happening to the file that was chosen. */
interface Sending {
  readonly file?: File;
  readonly progress?: number;
  readonly problem?: Problem;
}

const IDLE: Sending = {};

/** First step: a file is chosen or dropped, and sent. */
@Component({
  selector: 'app-file-step',
  imports: [Icon, MatButtonModule, MatProgressBarModule, ProblemNote, StepHeading],
  templateUrl: './file-step.html',
  styleUrls: ['../step.scss', './file-step.scss'],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class FileStep {
  protected readonly list = inject(ImportStore);

  private readonly chosen = new Subject<File | null>();

  protected readonly example = EXAMPLE;
  protected readonly isOver = signal(false);
  protected readonly sending = toSignal(
    this.chosen.pipe(
      switchMap((file): Observable<Sending> => (file === null ? of(IDLE) : this.send(file))),
    ),
    { initialValue: IDLE },
  );
  protected readonly percent = computed(() => Math.round((this.sending().progress ?? 0) * 100));

  protected choose(input: HTMLInputElement): void {
    this.take(input.files?.item(0));
    // The same file can be chosen again once it has been mended.
    input.value = '';
  }

  protected drop(event: DragEvent): void {
    event.preventDefault();
    this.isOver.set(false);
    this.take(event.dataTransfer?.files.item(0));
  }

  protected over(event: DragEvent): void {
    event.preventDefault();
    this.isOver.set(true);
  }

  protected stop(): void {
    this.chosen.next(null);
  }

  /** Gives up the file that was sent before, to choose another. */
  protected async again(): Promise<void> {
    await this.list.remove().catch(() => undefined);
    await this.list.open();
  }

  private take(file: File | null | undefined): void {
    if (file) this.chosen.next(file);
  }

  private send(file: File): Observable<Sending> {
    return this.list.upload(file).pipe(
      tap((upload) => {
        if ('proposal' in upload) void this.list.open(upload.proposal.id);
      }),
      map((upload) => ({ file, progress: 'progress' in upload ? upload.progress : 1 })),
      startWith({ file, progress: 0 }),
      catchError((error: unknown) => of({ file, problem: toProblem(error) })),
    );
  }
}
