import { followingSentences, leadSentence } from './answer';
import type { AnswerWords } from './AnswerBlock';
import { emptyAdvice } from './exclusionWords';
import type { ShownRanking } from './useRanking';

/** Which op-amp is quietest, or why there is none and what to change. */
export function opAmpAnswer({ first, items, request }: ShownRanking): AnswerWords {
  if (items.length > 0)
    return { lead: leadSentence(items[0], request), following: followingSentences(first, items, request) };
  return {
    lead: [{ text: 'No part is ranked.', strong: true }],
    following: emptyAdvice(first.excluded, request.filter?.search),
  };
}
