/** A calculation as a route: its name, what it does, and how it is asked and answered. */
export interface Calculation {
  readonly name: string;
  /** One sentence for whoever reads the document of the api. */
  readonly summary: string;
  /** The contract types of request and answer, by name: their schemas check and describe them. */
  readonly request: string;
  readonly answer: string;
  /** A request that can be sent as it stands; what it answers is worked out where it is shown. */
  readonly example: object;
  /** Takes what came, with no field that the request type does not know, and checks the rest itself. */
  readonly calculate: (request: unknown) => unknown;
}

interface Definition<Request extends object, Answer> extends Omit<Calculation, 'example' | 'calculate'> {
  readonly example: Request;
  readonly calculate: (request: Request) => Answer | Promise<Answer>;
}

/** A calculation whose example is checked against its function by the compiler. */
export function defineCalculation<Request extends object, Answer>({
  calculate,
  ...rest
}: Definition<Request, Answer>): Calculation {
  return { ...rest, calculate: (request) => calculate(request as Request) };
}
