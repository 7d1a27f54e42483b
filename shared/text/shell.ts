/** Words of the frame around every page. */
export const shellText = {
  product: 'Sixteenfold',
  description: 'Last-layer recognition for cube clubs.',
  skipToContent: 'Skip to content',
  signIn: 'Sign in',
  openPlaces: 'Your places',
  signOut: 'Sign out',
  administrator: 'administrator',
  administration: 'the administration',
  switchTo: (place: string) => `Switch to ${place}`,
  switchFailed: 'The switch did not work. Try again.',
  places: {
    today: 'Today',
    cases: 'My cases',
    form: 'Form',
    club: 'Club',
    squad: 'Squad',
    standings: 'Standings',
    programme: 'Programme',
    catalogue: 'Catalogue',
    ledger: 'Ledger',
    pictures: 'Pictures',
    intake: 'Intake',
    training: 'My training',
    desk: 'Desk',
  },
  clubAndRole: (club: string, role: string) => `${club} · ${role}`,
  loading: 'Loading',
  tryAgain: 'Try again',
  couldNotLoad: 'This could not be loaded.',
  offline: 'No connection. What you see may be old.',
  navigation: 'Places',
  sortBy: 'sort by',
  pages: {
    label: 'Pages',
    at: (page: number, of: number) => `Page ${page} of ${of}`,
    previous: 'Previous',
    next: 'Next',
  },
} as const;

/** The sentences of a page that is not there, not yours, or broken. */
export const problemPageText = {
  titleOf: (status: number) =>
    status === 404
      ? 'Not here'
      : status === 403
        ? 'Not yours to see'
        : status === 503
          ? 'Not available'
          : 'Something broke',
  detailOf: (status: number) =>
    status === 404
      ? 'There is nothing at this address. It may have been renamed, or belong to another club.'
      : status === 403
        ? 'Your role does not reach this place.'
        : status === 503
          ? 'The database does not answer. Try again in a moment.'
          : 'It has been written down. Try again; if it stays, tell your administrator.',
  home: 'To the first page',
} as const;
