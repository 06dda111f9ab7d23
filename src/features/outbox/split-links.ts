export interface TextPart {
  readonly text: string;
  readonly isLink: boolean;
}

/** Addresses of pages, without punctuation that ends the sentence around them. */
const ADDRESS = /(https?:\/\/[^\s<>"]*[^\s<>".,;:!?)\]'])/;

/** Plain text in parts, so that addresses of pages can be links. The parts put together are the text. */
export function splitLinks(text: string): TextPart[] {
  return text
    .split(ADDRESS)
    .map((part, i) => ({ text: part, isLink: i % 2 === 1 }))
    .filter((part) => part.text !== '');
}
