/** The demonstration's clubs and people. All of them are invented. */
export interface DemoPerson {
  readonly nickname: string;
  readonly role: 'member' | 'captain';
  /** e-mail, or an issued sign-in name. */
  readonly signIn: string;
  readonly minutesPerDay: number;
  readonly onBoards: boolean;
  readonly crossColours: 'white' | 'yellow' | 'white+yellow' | 'all';
  readonly holding: 'right' | 'left';
  /** Chance that they train on a given day. */
  readonly diligence: number;
  /** Share of a set's cases known when they joined; the likelier cases first. */
  readonly knows: number;
  /** How fast memory fades for them: above 1 is slower. */
  readonly retention: number;
  /** Seconds in which half of their sure recognitions are done. */
  readonly speed: number;
  /** Days before today on which they joined. */
  readonly joined: number;
}

export interface DemoClub {
  readonly name: string;
  readonly timeZone: string;
  readonly sets: readonly string[];
  readonly people: readonly DemoPerson[];
}

const usual = {
  role: 'member',
  minutesPerDay: 5,
  onBoards: true,
  crossColours: 'white',
  holding: 'right',
  joined: 120,
} as const;

export const DEMO_DAYS = 120;
export const SHARED_BOARD = { name: 'Quayside board', setKey: 'pll' } as const;

export const DEMO_CLUBS: readonly DemoClub[] = [
  {
    name: 'Harbour Lane Cubers',
    timeZone: 'Europe/Amsterdam',
    sets: ['pll', 'oll'],
    people: [
      {
        ...usual,
        nickname: 'Ines',
        role: 'captain',
        signIn: 'ines@harbourlane.example',
        diligence: 0.9,
        knows: 0.9,
        retention: 1.5,
        speed: 1.1,
        crossColours: 'white+yellow',
      },
      {
        ...usual,
        nickname: 'Tobi',
        signIn: 'tobi@harbourlane.example',
        diligence: 0.85,
        knows: 0.7,
        retention: 1.2,
        speed: 1.3,
        minutesPerDay: 4,
      },
      {
        ...usual,
        nickname: 'Marit',
        signIn: 'marit@harbourlane.example',
        diligence: 0.7,
        knows: 0.65,
        retention: 1,
        speed: 1.5,
        crossColours: 'all',
        minutesPerDay: 4,
      },
      {
        ...usual,
        nickname: 'Kofi',
        signIn: 'kofi@harbourlane.example',
        diligence: 0.65,
        knows: 0.55,
        retention: 0.85,
        speed: 1.6,
        minutesPerDay: 4,
      },
      {
        ...usual,
        nickname: 'Lene',
        signIn: 'lene@harbourlane.example',
        diligence: 0.6,
        knows: 0.5,
        retention: 0.7,
        speed: 1.75,
        holding: 'left',
        minutesPerDay: 3,
      },
      {
        ...usual,
        nickname: 'Arun',
        signIn: 'arun@harbourlane.example',
        diligence: 0.45,
        knows: 0.35,
        retention: 0.55,
        speed: 1.9,
        minutesPerDay: 3,
      },
      {
        ...usual,
        nickname: 'Pia',
        signIn: 'pia-harbour',
        diligence: 0.4,
        knows: 0.25,
        retention: 0.5,
        speed: 2.1,
        minutesPerDay: 2,
        joined: 75,
      },
      {
        ...usual,
        nickname: 'Joss',
        signIn: 'joss-harbour',
        diligence: 0.22,
        knows: 0.3,
        retention: 0.45,
        speed: 2.3,
        minutesPerDay: 2,
        onBoards: false,
      },
      {
        ...usual,
        nickname: 'Wen',
        signIn: 'wen@harbourlane.example',
        diligence: 0.75,
        knows: 0.2,
        retention: 0.9,
        speed: 1.5,
        joined: 50,
        crossColours: 'yellow',
        minutesPerDay: 3,
      },
      {
        ...usual,
        nickname: 'Sol',
        signIn: 'sol-harbour',
        diligence: 0.7,
        knows: 0.05,
        retention: 0.8,
        speed: 2,
        joined: 25,
        minutesPerDay: 2,
      },
    ],
  },
  {
    name: 'North Quay Cube Club',
    timeZone: 'Europe/Lisbon',
    sets: ['pll'],
    people: [
      {
        ...usual,
        nickname: 'Marlo',
        role: 'captain',
        signIn: 'marlo@northquay.example',
        diligence: 0.8,
        knows: 0.8,
        retention: 1.2,
        speed: 1.3,
        minutesPerDay: 2,
      },
      {
        ...usual,
        nickname: 'Edda',
        signIn: 'edda@northquay.example',
        diligence: 0.7,
        knows: 0.7,
        retention: 1.1,
        speed: 1.4,
        minutesPerDay: 2,
      },
      {
        ...usual,
        nickname: 'Rui',
        signIn: 'rui@northquay.example',
        diligence: 0.45,
        knows: 0.5,
        retention: 0.6,
        speed: 1.9,
        minutesPerDay: 2,
      },
      {
        ...usual,
        nickname: 'Noor',
        signIn: 'noor-quay',
        diligence: 0.5,
        knows: 0.4,
        retention: 0.8,
        speed: 1.6,
        minutesPerDay: 2,
      },
      // In both clubs, with a memory of his own in each.
      {
        ...usual,
        nickname: 'Tobi',
        signIn: 'tobi@harbourlane.example',
        diligence: 0.4,
        knows: 0.7,
        retention: 1.2,
        speed: 1.3,
        joined: 20,
        minutesPerDay: 2,
      },
    ],
  },
];
