/** What a message says; the layout makes HTML and plain text of it. */
export interface Letter {
  subject: string;
  /** Plain sentences: nothing in them is read as HTML. */
  paragraphs: string[];
  /** Lists below the paragraphs. */
  lists?: LetterList[];
  /** The one thing to do; `path` is an address of the application's own, such as `/prices`. */
  link?: { label: string; path: string };
  /** What to know about the message itself, in small print. */
  remark?: string;
}

export interface LetterList {
  /** What its items have in common; left out = the paragraphs say it. */
  heading?: string;
  items: string[];
}

/** What the layout adds to a letter. */
export interface Frame {
  /** What the application's addresses begin with. */
  origin: string;
  /** The page on which notices of this kind are refused; null = they can't be. */
  unsubscribeUrl: string | null;
}
