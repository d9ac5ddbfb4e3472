/** More tabs than anybody looks at; what goes beyond is left behind by a broken client, or by one with bad intent. */
const mostPerPerson = 20;

/** The streams that are open, by person. One more than a person may have closes their oldest. */
export class OpenStreams {
  private readonly byPerson = new Map<string, Set<() => void>>();

  /**
   * Counts a stream in.
   * @param close ends the stream; called when it has become one too many
   * @returns counts it out again
   */
  add(personId: string, close: () => void): () => void {
    const open = this.byPerson.get(personId) ?? new Set();
    this.byPerson.set(personId, open.add(close));
    const [oldest] = open;
    if (open.size > mostPerPerson) oldest?.();
    return () => {
      open.delete(close);
      if (open.size === 0 && this.byPerson.get(personId) === open) this.byPerson.delete(personId);
    };
  }
}
