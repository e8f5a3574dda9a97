import { ComponentHarness } from '@angular/cdk/testing';

/** Reads the two states of a receiver in specs. */
export class ConflictHarness extends ComponentHarness {
  static readonly hostSelector = 'app-conflict';

  private readonly cells = this.locatorForAll('tbody th, tbody td');

  /** Field, mine and theirs, row by row. */
  async rows(): Promise<string[][]> {
    const texts = await Promise.all((await this.cells()).map((cell) => cell.text()));
    return Array.from({ length: texts.length / 3 }, (_, row) => texts.slice(3 * row, 3 * row + 3));
  }
}
