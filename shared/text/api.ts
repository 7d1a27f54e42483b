export const apiText = {
  noAnswer: 'No answer from the server. Check the connection and try again.',
  broken: 'Something broke on our side. Try again.',
} as const;
