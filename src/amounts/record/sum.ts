/**
 * A sum that keeps what each addition rounds off (Neumaier, Z. angew. Math. Mech. 54 (1974) 39; from memory): the error
 * does not grow with the number of terms, so that ten million rows sum as well as ten.
 */
export class CompensatedSum {
  private sum = 0;
  private lost = 0;

  add(term: number): void {
    const sum = this.sum + term;
    this.lost += Math.abs(this.sum) >= Math.abs(term) ? this.sum - sum + term : term - sum + this.sum;
    this.sum = sum;
  }

  get value(): number {
    return this.sum + this.lost;
  }

  /** This sum less `other`, without rounding either first: two large sums may nearly cancel. */
  less(other: CompensatedSum): number {
    return this.sum - other.sum + (this.lost - other.lost);
  }
}
