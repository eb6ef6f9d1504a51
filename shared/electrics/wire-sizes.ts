/** A wire's size as written and its copper's cross-section in square millimetres. */
export interface WireSize {
  readonly written: string;
  readonly squareMillimetres: number;
}
