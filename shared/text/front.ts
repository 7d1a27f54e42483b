/** The first page and the sign-in page. */
export const frontText = {
  title: 'Know every last layer at a glance',
  lead: 'Sixteenfold keeps a cube club’s last-layer cases recognisable with a few minutes a day on a phone, and tells its captain the truth about the squad.',
  roles: [
    {
      who: 'Members',
      what: 'See a case, say when you have it, name it with its AUF. What slips comes back; what holds stays away. Each minute goes where it saves most solves.',
    },
    {
      who: 'Captains',
      what: 'Set the programme, see the chance that the next case a solve deals is held, member by member and case by case, and pick a line-up on figures that rest on something.',
    },
    {
      who: 'Administrators',
      what: 'Bring in case sets from files. Every algorithm is turned on a cube and read back; none goes out under a wrong name.',
    },
  ],
  counts: [
    { number: '62,208', label: 'last-layer states' },
    { number: '3,916', label: 'cases, by the sixteen-fold action' },
    { number: '57 + 21', label: 'OLL and PLL, each with its exact prior' },
  ],
  open: 'Open your places',
  signIn: {
    title: 'Sign in',
    name: 'E-mail or sign-in name',
    password: 'Password',
    go: 'Sign in',
    going: 'Signing in',
    problemTitle: 'You are not signed in yet',
    documentError: 'Error: Sign in',
    nameMissing: 'Type your e-mail address or sign-in name.',
    passwordMissing: 'Type your password.',
    demoTitle: 'Demo accounts',
    demoLead: 'This is a demonstration with invented clubs and people.',
    demoUse: (who: string) => `Use the account of ${who}`,
    use: 'use',
    columns: { who: 'Who', signIn: 'Sign-in', password: 'Password' },
    help: 'Forgotten it? Your captain can issue a new one.',
  },
} as const;
