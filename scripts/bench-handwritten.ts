/**
 * The baseline of the benchmark: a typed-array loop written by hand for the bench
 * model (tests/fixtures/bench-model.json) and nothing else. One pass a draw, all of
 * a cohort in local variables.
 */
const CYCLES = 25;
const RATE = 0.03;

export interface HandWritten {
  /** By strategy, one value a draw. */
  readonly cost: Float64Array[];
  readonly outcome: Float64Array[];
}

/**
 * @param p draws by parameter symbol
 * @param profiles start age, 1 for women, share of the population
 */
export function handWritten(
  p: Record<string, Float64Array>,
  profiles: readonly { age: number; female: number; share: number }[],
  draws: number,
): HandWritten {
  const column = () => new Float64Array(draws);
  const cost = [column(), column(), column(), column()];
  const outcome = [column(), column(), column(), column()];
  const none = column();
  const effects = [none, p.effect_2!, p.effect_3!, p.effect_4!];
  const prices = [none, p.price_2!, p.price_3!, p.price_4!];
  const discount = Float64Array.from({ length: CYCLES }, (_, c) => (1 + RATE) ** -(c + 1));
  const { a_to_b, a_to_dead, age_on_b, age_on_dead, sex_on_b, sex_on_dead } = p;
  const { b_to_a, b_to_c, b_to_dead, death_in_c } = p;
  for (let s = 0; s < 4; s++) {
    const effect = effects[s]!;
    const price = prices[s]!;
    const costs = cost[s]!;
    const outcomes = outcome[s]!;
    for (const { age, female, share } of profiles) {
      for (let i = 0; i < draws; i++) {
        const ab = Math.exp(
          a_to_b![i]! + effect[i]! + age_on_b![i]! * age + sex_on_b![i]! * female,
        );
        const ad = Math.exp(a_to_dead![i]! + age_on_dead![i]! * age + sex_on_dead![i]! * female);
        const a = 1 / (1 + ab + ad);
        const pab = ab * a;
        const ba = Math.exp(b_to_a![i]!);
        const bc = Math.exp(b_to_c![i]!);
        const b = 1 / (1 + ba + bc + Math.exp(b_to_dead![i]!));
        const pba = ba * b;
        const pbc = bc * b;
        const pcc = Math.exp(-death_in_c![i]!);
        const costA = p.cost_a![i]! + price[i]!;
        const costB = p.cost_b![i]!;
        const costC = p.cost_c![i]!;
        const utilityA = p.utility_a![i]!;
        const utilityB = p.utility_b![i]!;
        const utilityC = p.utility_c![i]!;
        let inA = 1;
        let inB = 0;
        let inC = 0;
        let money = 0;
        let health = 0;
        for (let c = 0; c < CYCLES; c++) {
          const nextA = inA * a + inB * pba;
          const nextB = inA * pab + inB * b;
          inC = inB * pbc + inC * pcc;
          inA = nextA;
          inB = nextB;
          const d = discount[c]!;
          money += d * (inA * costA + inB * costB + inC * costC);
          health += d * (inA * utilityA + inB * utilityB + inC * utilityC);
        }
        costs[i] = costs[i]! + share * money;
        outcomes[i] = outcomes[i]! + share * health;
      }
    }
  }
  return { cost, outcome };
}
