/** A move of the poise. */
export interface Move {
  /** Threshold that it comes to. */
  readonly to: number;
  /** Whether a new movement begins here: "was" then tells of the place it left. */
  readonly starts: boolean;
}
