/**
 * A longest strictly rising subsequence of distinct numbers (patience sorting; Fredman
 * 1975, On computing the length of longest increasing subsequences; from memory). What
 * it leaves out is the fewest items that were moved.
 */
export function longestRising(numbers: readonly number[]): number[] {
  /** Index of the smallest end of a rising run of each length. */
  const ends: number[] = [];
  const previous: (number | undefined)[] = [];
  numbers.forEach((number, index) => {
    const length = lowerBound(ends, (end) => numbers[end]! < number);
    previous.push(ends[length - 1]);
    ends[length] = index;
  });
  const run: number[] = [];
  for (let at = ends.at(-1); at !== undefined; at = previous[at]) run.push(numbers[at]!);
  return run.reverse();
}

/** How many from the start of a sorted list pass the test. */
function lowerBound(list: readonly number[], passes: (item: number) => boolean): number {
  let low = 0;
  let high = list.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (passes(list[middle]!)) low = middle + 1;
    else high = middle;
  }
  return low;
}
