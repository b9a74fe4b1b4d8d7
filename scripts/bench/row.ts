/** One line of the performance table. `ok` is absent where there is no budget to keep. */
export interface BenchRow {
  name: string;
  value: string;
  budget?: string;
  ok?: boolean;
}
