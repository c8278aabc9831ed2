/** One measured figure; it meets its goal when it is not above it. */
export interface BenchRow {
  readonly name: string;
  readonly value: number;
  readonly goal: number;
  readonly unit: string;
}
