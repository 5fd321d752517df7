import type { Span } from './span.ts';

/** A reaction ready to be shown: the contract's REACTION. Exact numbers are strings. */
export interface ShownReaction {
  readonly plain: string;
  readonly terms: readonly { readonly species: string; readonly nu: string; readonly state: string | null }[];
}

/** Why nothing balances: exact weights on elements and charge, and what they say in words. */
export interface Certificate {
  /** Keys: element or nuclide, or `charge`. The weighted sum is 0 for every helper and never negative in what the skeleton gains. */
  readonly weights: Readonly<Record<string, string>>;
  readonly text: string;
}

/** One way to settle what conservation leaves open. */
export interface ShownCoupling {
  readonly assume: string;
  /** Of a redox skeleton. */
  readonly overall?: ShownReaction;
  /** Of a half-reaction. */
  readonly reaction?: ShownReaction;
  readonly electrons: string;
}

interface Common {
  /** One sentence: what is wrong. */
  readonly message: string;
  /** The part of the ask: `skeleton`, `anode[1]`, `given.current`. The desk adds it. */
  readonly field?: string;
  /** Code points in that part's text. */
  readonly span?: Span;
  /** What to try. */
  readonly hint?: string;
}

/** Codes that carry nothing but words and a place. */
export type PlainFaultCode =
  | 'empty'
  | 'too-long'
  | 'unknown-character'
  | 'unknown-element'
  | 'bad-charge'
  | 'bad-count'
  | 'bracket'
  | 'no-arrow'
  | 'empty-side'
  | 'unknown-medium'
  | 'electrode-direction'
  | 'unknown-unit'
  | 'unknown-quantity'
  | 'contradiction'
  | 'bad-ask';

/** Every way an ask can fail: the contract's fault codes and what each carries. */
export type Fault =
  | (Common & { readonly code: PlainFaultCode })
  | (Common & { readonly code: 'several-readings'; readonly readings: readonly string[] })
  | (Common & { readonly code: 'missing-element'; readonly element: string })
  | (Common & { readonly code: 'no-balance'; readonly certificate: Certificate })
  | (Common & { readonly code: 'wrong-side'; readonly species: string; readonly reaction: ShownReaction })
  | (Common & { readonly code: 'idle-species'; readonly species: string })
  | (Common & {
      readonly code: 'several-balances';
      readonly dimension: number;
      readonly family: readonly ShownReaction[];
      readonly couplings: readonly ShownCoupling[];
      /** Only where asked for: the Hilbert basis. */
      readonly irreducible?: readonly ShownReaction[];
    })
  | (Common & { readonly code: 'no-electrons'; readonly reaction: ShownReaction })
  | (Common & { readonly code: 'not-enough-given'; readonly missing: readonly string[] })
  | (Common & { readonly code: 'too-hard'; readonly limit: string });

/** A code of the contract. */
export type FaultCode = Fault['code'];
