import { canonicalJson, sha256Of } from './canonical-json';

/** First 12 digits of the SHA-256 over inputs, context, answer and edition of the method. */
export function contentCodeOf(content: {
  input: unknown;
  context: unknown;
  evaluation: unknown;
  methodEdition: string;
}): string {
  return sha256Of(canonicalJson(content)).slice(0, 12);
}
