import { effect, inject, Injector, type Signal, ViewContainerRef } from '@angular/core';
import { MatDialog, type MatDialogRef } from '@angular/material/dialog';

import type { LedgerContext } from './ledger-facts';

/**
 * Shows the working as long as there is one to show: what the address names decides, not a press.
 * Closing gives the focus back to the mark or row it was asked from. Call while the page is made.
 */
export function openLedger(context: Signal<LedgerContext | null>, closed: () => void): void {
  const dialog = inject(MatDialog);
  const viewContainerRef = inject(ViewContainerRef);
  let shown: MatDialogRef<unknown> | null = null;
  let wanted: LedgerContext | null = null;
  effect(
    (onCleanup) => {
      wanted = context();
      onCleanup(() => (wanted = null));
      if (!wanted) shown?.close();
      if (!wanted || shown) return;
      const data = wanted;
      void import('./ledger').then(({ Ledger }) => {
        if (wanted !== data || shown) return;
        shown = dialog.open(Ledger, { data, viewContainerRef, width: '52rem', maxWidth: '96vw' });
        shown.afterClosed().subscribe(() => {
          shown = null;
          if (wanted) closed();
        });
      });
    },
    { injector: inject(Injector) },
  );
}
