import { answerDates } from '#shared/dates/answer-dates.ts';
import type { DateAnswers } from '#shared/dates/answer-dates.ts';
import type { LocalDate } from '#shared/dates/local-time.ts';
import type { Demand } from '#shared/dates/model.ts';
import type { KeptBook } from './kept-book.ts';
import { logFaults } from './log-faults.ts';

/** Questions remembered with one book; a book lives ten minutes at most. */
const mostAnswers = 200;

/** Answers from a book, remembered with it by the work asked about and the range. */
export function answersOf(
  book: KeptBook,
  demand: Demand,
  from: LocalDate,
  to: LocalDate,
): DateAnswers {
  const question = JSON.stringify([demand, from, to]);
  let answers = book.answers.get(question);
  if (answers === undefined) {
    answers = answerDates(book.open, demand, from, to);
    logFaults(answers.faults);
    if (book.answers.size >= mostAnswers) book.answers.clear();
    book.answers.set(question, answers);
  }
  return answers;
}
