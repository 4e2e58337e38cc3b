import type { UseMutationResult } from '@tanstack/react-query';

interface Afterwards<Output> {
  onSuccess?: (output: Output) => void;
  /** The mutation keeps its error to show; this is for what else is to be done. */
  onError?: (error: Error) => void;
}

/**
 * Does a mutation and then what follows from it. The callbacks of `mutate` itself are lost when the row or form that
 * asked is taken away by the lists asked anew; here the toast is said and the draft dropped all the same.
 */
export function carryOut<Input, Output>(
  mutation: Pick<UseMutationResult<Output, Error, Input>, 'mutateAsync'>,
  input: NoInfer<Input>,
  { onSuccess, onError = () => undefined }: Afterwards<Output>,
): void {
  void mutation.mutateAsync(input).then(onSuccess, onError);
}
