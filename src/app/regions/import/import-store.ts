import { HttpClient, type HttpEvent, HttpEventType } from '@angular/common/http';
import { computed, inject, Injectable } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute, Router } from '@angular/router';
import {
  BehaviorSubject,
  catchError,
  combineLatest,
  filter,
  firstValueFrom,
  map,
  type Observable,
  of,
  switchMap,
} from 'rxjs';

import {
  type ImportLayout,
  type ImportMatching,
  type ImportProposal,
  importProposal,
  type ImportState,
} from '../../../../shared/contracts/list-import';
import type { Problem } from '../../../../shared/contracts/problem';
import { toProblem } from '../../core/api-problem';
import { type ImportStep, stepFor } from './import-steps';
import { watchImport } from './watch-import';

/** How far an upload is: a share from 0 to 1, or what the server found in the file. */
export type Upload = { readonly progress: number } | { readonly proposal: ImportProposal };

interface Seen {
  readonly state?: ImportState;
  readonly problem?: Problem;
}

const NOTHING: Seen = {};

/**
 * The import that the address names: its state on the server, and what can be done to it. Given by
 * the page, so that every step works on the same one. Verbs reject with the server's problem.
 */
@Injectable()
export class ImportStore {
  private readonly http = inject(HttpClient);
  private readonly route = inject(ActivatedRoute);
  private readonly router = inject(Router);

  private readonly params = toSignal(this.route.paramMap, { requireSync: true });
  private readonly query = toSignal(this.route.queryParamMap, { requireSync: true });
  private readonly asked = new BehaviorSubject<void>(undefined);

  readonly regionId = computed(() => this.params().get('id') ?? '');
  readonly importId = computed(() => this.params().get('importId'));
  private readonly imports = computed(
    () => `/api/regions/${encodeURIComponent(this.regionId())}/imports`,
  );
  /** Where the server keeps this import; null before there is one. */
  readonly address = computed(() => {
    const id = this.importId();
    return id === null ? null : `${this.imports()}/${encodeURIComponent(id)}`;
  });
  private readonly seen = toSignal(
    combineLatest([toObservable(this.address), this.asked]).pipe(
      switchMap(([address]): Observable<Seen> =>
        address === null ? of(NOTHING) : this.watch(address),
      ),
    ),
    { initialValue: NOTHING },
  );

  readonly state = computed(() => this.seen().state);
  readonly problem = computed(() => this.seen().problem);
  readonly step = computed(() =>
    stepFor(this.query().get('step') ?? undefined, this.state()?.state),
  );

  /** Asks for the state again; until the answer is there the last one stands. */
  refresh(): void {
    this.asked.next();
  }

  goTo(step: ImportStep): void {
    if (step === this.step()) return;
    void this.router.navigate([], { relativeTo: this.route, queryParams: { step } });
  }

  /** Goes to the page of an import, or, without one, to the beginning of a new one. */
  async open(importId?: number): Promise<void> {
    const end = importId === undefined ? [] : [importId];
    await this.router.navigate(['/regions', this.regionId(), 'import', ...end], {
      replaceUrl: importId !== undefined,
    });
  }

  /** Sends a file; unsubscribing stops it. */
  upload(file: File): Observable<Upload> {
    const body = new FormData();
    body.append('file', file, file.name);
    return this.http.post(this.imports(), body, { reportProgress: true, observe: 'events' }).pipe(
      map(toUpload),
      filter((upload) => upload !== null),
    );
  }

  /** Takes the file apart otherwise; what it holds is proposed anew. */
  async layOut(layout: ImportLayout): Promise<void> {
    await firstValueFrom(this.http.put(`${this.address() ?? ''}/reading`, layout));
    this.refresh();
  }

  /** Says how the list is to be read, and has it checked. */
  async check(matching: ImportMatching): Promise<void> {
    await firstValueFrom(this.http.put(this.address() ?? '', matching));
    this.refresh();
  }

  /** Begins to store the checked list. */
  async commit(): Promise<void> {
    await firstValueFrom(this.http.post(`${this.address() ?? ''}/commit`, {}));
    this.refresh();
  }

  /** Cancels, or undoes what was stored. */
  async remove(): Promise<void> {
    await firstValueFrom(this.http.delete(this.address() ?? ''));
    this.refresh();
  }

  private watch(address: string): Observable<Seen> {
    return watchImport(this.http, address).pipe(
      map((state) => ({ state })),
      catchError((error: unknown) => of({ problem: toProblem(error) })),
    );
  }
}

function toUpload(event: HttpEvent<unknown>): Upload | null {
  if (event.type === HttpEventType.Response) return { proposal: importProposal.parse(event.body) };
  if (event.type !== HttpEventType.UploadProgress) return null;
  return { progress: event.total ? event.loaded / event.total : 0 };
}
