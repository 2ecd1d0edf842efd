/** What the finder can find. */
export interface Entry {
  /** Its own among all entries. */
  readonly id: string;
  readonly kind: 'step' | 'parameter' | 'state' | 'variable' | 'strategy' | 'action';
  readonly name: string;
  /** The symbol that formulas use, where there is one. */
  readonly symbol?: string;
  readonly act: () => void;
}
