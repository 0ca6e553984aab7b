/** Id of a question's element, from its row key. */
export const questionId = (key: string): string => `question-${key.replace(/[^a-z0-9]/gi, '-')}`;
