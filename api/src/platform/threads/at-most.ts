/** Runs tasks, so many at once and no more; the others wait their turn in the order they came. */
export class AtMost {
  private readonly waiting: (() => void)[] = [];
  private running = 0;

  constructor(private readonly most: number) {}

  async run<T>(task: () => Promise<T>): Promise<T> {
    if (this.running >= this.most) {
      await new Promise<void>((turn) => {
        this.waiting.push(turn);
      });
    } else {
      this.running += 1;
    }
    try {
      return await task();
    } finally {
      // The place goes straight to the next one, so that nobody new slips in between.
      const next = this.waiting.shift();
      if (next) next();
      else this.running -= 1;
    }
  }
}
