import { calculations } from '../../calculations/calculations.js';
import { contract, type Operation } from '../operation.js';

/** Every calculation; what its example answers is worked out by the calculation itself. */
export async function calculationOperations(): Promise<readonly Operation[]> {
  return Promise.all(
    calculations.map(async ({ name, summary, request, answer, example, calculate }): Promise<Operation> => {
      const content = contract(answer, await calculate(example));
      return {
        ...{ method: 'post', path: `/calculations/${name}`, tag: 'Calculations', who: 'calculate', summary },
        body: contract(request, example),
        answers: { 200: { description: 'The answer. Its numbers are not rounded.', content } },
      };
    }),
  );
}
