import { BigIntType } from '@mikro-orm/core';

/** Instants in ms UTC and counters: bigint in the database, number in the program (below 2⁵³ for 285 000 years). */
export class WholeNumberType extends BigIntType<'number'> {
  constructor() {
    super('number');
  }
}
