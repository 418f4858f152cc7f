/** A failure that its sentence explains: it is printed without a stack. */
export class PlainFailure extends Error {}

/** Prints a failure: one sentence where the cause is known, the stack where it is a fault of the program. */
export function printFailure(error) {
  console.error(error instanceof PlainFailure ? error.message : error);
}
