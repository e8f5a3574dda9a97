import {
  ChangeDetectionStrategy,
  Component,
  computed,
  inject,
  input,
  linkedSignal,
  type OnInit,
  output,
  signal,
  viewChild,
} from '@angular/core';
import { takeUntilDestroyed, toSignal } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { RouterLink } from '@angular/router';
import { debounceTime, filter, map, startWith } from 'rxjs';

import { newReceiver, type StoredReceiver } from '../../../../../shared/contracts/receiver';
import { toProblem } from '../../../core/api-problem';
import { Drafts } from '../../../core/drafts';
import { type SetType, setTypes } from '../../../core/set-types';
import { FormProblems } from '../../../ui/form-problems/form-problems';
import { ProblemTextPipe } from '../../../ui/form-problems/problem-text-pipe';
import { Submission } from '../../../ui/form-problems/submission';
import { QuantityInput } from '../../../ui/quantity/quantity-input';
import { BandRows } from '../band-rows/band-rows';
import { BandSketch } from '../band-sketch/band-sketch';
import { Conflict } from '../conflict/conflict';
import { MorePanels } from '../more-panels/more-panels';
import { SetTypeChoice } from '../set-type-choice/set-type-choice';
import { SetUpStore } from '../set-up-store';
import { applyCircuits, applySetType } from './apply-set-type';
import { receiverControls } from './controls';
import { fieldsOf, receiverOf, writeFields } from './fields';
import { NoticeList } from './notice-list';
import { notices } from './notices';
import { ReceiverDraftKeeper } from './receiver-draft';

const PAUSE_MS = 400;

/** The set-up of a receiver: type of set, IF and bands first, the rest on demand. */
@Component({
  selector: 'app-receiver-form',
  imports: [
    BandRows,
    BandSketch,
    Conflict,
    FormProblems,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    MorePanels,
    NoticeList,
    ProblemTextPipe,
    QuantityInput,
    ReactiveFormsModule,
    RouterLink,
    SetTypeChoice,
  ],
  templateUrl: './receiver-form.html',
  styleUrl: './receiver-form.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class ReceiverForm implements OnInit {
  private readonly store = inject(SetUpStore);
  private readonly drafts = inject(Drafts);

  /** The receiver as it is kept; none while it is new. */
  readonly receiver = input<StoredReceiver>();

  /** Id of the type of set, and the IF, that a new receiver begins from. */
  readonly type = input<string>();
  readonly ifHz = input<number>();

  readonly kept = output<StoredReceiver>();

  private readonly more = viewChild.required(MorePanels);

  protected readonly form = receiverControls();
  protected readonly submission = new Submission(this.form, newReceiver, toProblem);
  protected readonly chosenType = signal<SetType | null>(null);
  protected readonly isRestored = signal(false);
  /** What somebody else saved while this form was being filled in. */
  protected readonly conflict = signal<StoredReceiver | null>(null);
  /** The version that saving replaces. */
  private readonly version = linkedSignal(() => this.receiver()?.version ?? null);

  protected readonly fields = toSignal(
    this.form.valueChanges.pipe(
      startWith(null),
      map(() => this.form.getRawValue()),
    ),
    { requireSync: true },
  );
  protected readonly notices = computed(() => notices(this.fields()));
  protected readonly isTypeAsked = linkedSignal(() => this.receiver() === undefined);
  protected readonly isReadOnly = computed(() => this.receiver()?.editable === false);

  constructor() {
    this.form.valueChanges
      .pipe(
        debounceTime(PAUSE_MS),
        filter(() => this.form.dirty),
        takeUntilDestroyed(),
      )
      .subscribe(() => {
        const type = this.chosenType();
        if (type) applyCircuits(this.form, type);
        this.draft().write({ version: this.version(), fields: this.form.getRawValue() });
      });
  }

  ngOnInit(): void {
    this.showKept();
    const draft = this.draft().read();
    if (draft === undefined || this.isReadOnly() || !writeFields(this.form, draft.fields)) {
      this.beginFrom(this.type(), this.ifHz());
      return;
    }
    this.form.markAsDirty();
    this.version.set(draft.version);
    this.isRestored.set(true);
  }

  hasUnsavedChanges(): boolean {
    return this.form.dirty;
  }

  protected chooseType(type: SetType | null): void {
    this.chosenType.set(type);
    if (type) applySetType(this.form, type);
  }

  protected reveal(path: string): void {
    this.more().reveal(path);
  }

  protected async save(): Promise<void> {
    const id = this.receiver()?.id;
    const version = this.version();
    const value = receiverOf(this.form.getRawValue());
    const saved = await this.submission.send(value, (draft) =>
      id === undefined || version === null
        ? this.store.add(draft)
        : this.store.change(id, version, draft),
    );
    if (saved === undefined) return;
    if ('current' in saved) {
      this.conflict.set(saved.current);
      return;
    }
    this.draft().remove();
    this.form.markAsPristine();
    this.kept.emit(saved.kept);
  }

  /** Saves over what the other has saved. */
  protected async keepMine(current: StoredReceiver): Promise<void> {
    this.version.set(current.version);
    this.conflict.set(null);
    await this.save();
  }

  /** Goes on from what the other has saved; what was typed stays as the draft. */
  protected takeTheirs(current: StoredReceiver): void {
    this.version.set(current.version);
    this.conflict.set(null);
    writeFields(this.form, fieldsOf(current));
    this.form.markAsPristine();
  }

  protected discardDraft(): void {
    this.draft().remove();
    this.isRestored.set(false);
    this.version.set(this.receiver()?.version ?? null);
    this.chosenType.set(null);
    this.showKept();
  }

  private beginFrom(typeId: string | undefined, ifHz: number | undefined): void {
    const type = setTypes.find(({ id }) => id === typeId);
    if (this.receiver() !== undefined || type === undefined) return;
    this.chooseType(type);
    if (ifHz !== undefined && Number.isFinite(ifHz)) this.form.controls.ifHz.setValue(ifHz);
  }

  /** Shows the receiver as it is kept, or empty fields. */
  private showKept(): void {
    const receiver = this.receiver();
    this.form.reset();
    writeFields(this.form, receiver ? fieldsOf(receiver) : { bands: [{ circuits: [{}] }] });
    this.form.markAsPristine();
    if (this.isReadOnly()) this.form.disable();
  }

  private draft(): ReceiverDraftKeeper {
    return new ReceiverDraftKeeper(this.drafts, this.receiver()?.id);
  }
}
