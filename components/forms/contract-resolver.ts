import type { FieldValues, Resolver } from 'react-hook-form';
import type { z } from 'zod';

type Contract = typeof import('@/contract');

/** Checks a form against a schema of the contract. The schemas come when the first form is checked, not with the first page. */
export function contractResolver<Values extends FieldValues>(
  choose: (contract: Contract) => z.ZodType<Values, Values>,
): Resolver<Values, unknown, Values> {
  return async (values, context, options) => {
    const { contract, zodResolver } = await import('@/components/on-demand');
    return zodResolver(choose(contract))(values, context, options);
  };
}
