/** Words of a showing that the server writes too. */
export const todayWords = {
  solved: 'solved',
} as const;
