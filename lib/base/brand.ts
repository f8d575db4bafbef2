declare const brandKey: unique symbol;

/**
 * A nominal type: a `Brand<string, 'CutId'>` is a string that the compiler will not confuse with any other.
 * Brands cost nothing at run time; make one only through the constructor that belongs to it.
 */
export type Brand<T, Name extends string> = T & { readonly [brandKey]: Name };
