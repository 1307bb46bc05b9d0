/**
 * Where a name leaves something open, building asks here which way to go. Running the same building again and again
 * walks through all combinations, in the order in which the possibilities were offered.
 */
export class Choices {
  #path: { chosen: number; of: number }[] = [];
  #at = 0;

  /** A number from 0 to `of` − 1. */
  pick(of: number): number {
    if (of <= 1) return 0;
    const known = this.#path[this.#at];
    if (known) {
      this.#at++;
      return known.chosen;
    }
    this.#path.push({ chosen: 0, of });
    this.#at++;
    return 0;
  }

  /** Goes to the next combination; false when there is none left. */
  advance(): boolean {
    this.#path.length = this.#at;
    this.#at = 0;
    while (this.#path.length > 0) {
      const last = this.#path[this.#path.length - 1]!;
      if (++last.chosen < last.of) return true;
      this.#path.pop();
    }
    return false;
  }
}
