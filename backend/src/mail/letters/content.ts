/** A letter in words, before it becomes text and HTML. */
export interface LetterContent {
  subject: string;
  paragraphs: string[];
  facts: [label: string, value: string][];
  action: { label: string; url: string } | null;
  closing: string[];
}
