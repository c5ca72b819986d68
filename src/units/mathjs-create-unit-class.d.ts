// mathjs exports this factory but its type declarations leave it out.
import 'mathjs';

declare module 'mathjs' {
  export function createUnitClass(scope: object): unknown;
}
