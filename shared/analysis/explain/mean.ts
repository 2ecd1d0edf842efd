/** A weighted mean that keeps its sum, and gives a value all share as it is. */
export class Mean {
  weight = 0;
  /** Sum of weight x value. */
  sum = 0;
  private shared: number | null = null;
  private differs = false;

  add(weight: number, value: number): void {
    this.weight += weight;
    this.sum += weight * value;
    this.differs ||= this.shared !== null && this.shared !== value;
    this.shared = value;
  }

  /** Adds a sum whose single values are not known. */
  addSum(weight: number, sum: number): void {
    this.weight += weight;
    this.sum += sum;
    this.differs = true;
  }

  /** Null where values differ and nothing weighs, or nothing was added. */
  get value(): number | null {
    if (!this.differs) return this.shared;
    return this.weight === 0 ? null : this.sum / this.weight;
  }
}
