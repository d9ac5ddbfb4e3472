import file from '../../../test-data/reference/reference-values.json' with { type: 'json' };

/** A figure, figures in their order, figures by name, or a sentence. */
export type Expected =
  number | string | readonly number[] | Readonly<Record<string, number | string | readonly number[]>>;

/** One value worked out, or only copied, from outside. */
export interface Check {
  readonly id: string;
  readonly title: string;
  readonly inputs: Readonly<Record<string, unknown>>;
  readonly expected: Expected;
  readonly unit: string;
  readonly source: readonly string[];
  /** False where the figure was copied from print and worked out by nobody: no evidence for a formula. */
  readonly recomputed: boolean;
}

const checks = file.checks as unknown as readonly (Check & { readonly topic_name: string })[];

/** For tests: every check of a topic, by its id. Throws for a topic that has none. */
export function checksOf(topicName: string): ReadonlyMap<string, Check> {
  const found = checks.filter((check) => check.topic_name === topicName);
  if (found.length === 0) throw new Error(`There are no checks of “${topicName}”.`);
  return new Map(found.map((check) => [check.id, check]));
}
