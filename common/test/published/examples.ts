/** A printed example: what it gives, what is printed, and how closely the engine has to meet it. */
export interface PublishedExample {
  /** Document, edition and clause, page or example. */
  source: string;
  title: string;
  /** Computed by the engine from what the source gives. */
  computed: () => Record<string, number | null>;
  printed: Record<string, number>;
  /** Accepted difference of every figure, or of each by its name. */
  within: number | Record<string, number>;
  /** Why just so much: half of the last printed digit, or what the source claims. */
  why: string;
}
