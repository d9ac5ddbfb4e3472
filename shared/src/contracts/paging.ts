/** One page of a list; `next` is the cursor of the page after it, or null at the end. */
export interface Page<T> {
  readonly items: readonly T[];
  readonly next: string | null;
}
