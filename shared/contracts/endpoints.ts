import type { CaseChoices, DefineSetInput, PreviewSetInput, SetAliasInput, SetPreview } from './case-sets.ts';
import type {
  CatalogueCasesInput,
  CatalogueCasesView,
  CatalogueSetInput,
  CatalogueSetView,
  CatalogueView,
  EditionView,
} from './catalogue.ts';
import type { CatalogueCaseInput, CatalogueCaseView } from './catalogue-case.ts';
import type { ConfusableView, DrawnInput, DrawnView, SearchInput, SearchView } from './catalogue-search.ts';
import type { CatalogueSheetInput, CatalogueSheetView } from './catalogue-sheet.ts';
import type {
  AssignSetInput,
  MemberPageView,
  ProgrammeView,
  SquadView,
  StandingsView,
  WithdrawSetInput,
} from './desk.ts';
import { endpoint } from './endpoint.ts';
import type {
  DiscardInput,
  DraftView,
  IntakeView,
  PublishInput,
  SettleLineInput,
  UploadInput,
} from './intake.ts';
import type { LedgerCasesInput, LedgerCasesView, LedgerInput, LedgerView } from './ledger.ts';
import type { ClubView, FormView, MemberSettings, MyCasesView, MyCaseView } from './member.ts';
import type { PictureSettings } from './pictures.ts';
import type { SessionView, SignedIn, SignInInput, SignInPage, SwitchClubInput } from './session.ts';
import type { AnswersInput, AnswersResult, MisTapInput, TodayView } from './today.ts';

type Nothing = Record<string, never>;

/** Every endpoint of the API. The server's table (server/api/contract.ts) must list each of them. */
export const endpoints = {
  signInPage: endpoint<Nothing, SignInPage>('signInPage', 'GET', '/api/sign-in-page'),
  signIn: endpoint<SignInInput, SignedIn>('signIn', 'POST', '/api/session'),
  readSession: endpoint<Nothing, SessionView>('readSession', 'GET', '/api/session'),
  refreshSession: endpoint<Nothing, SessionView>('refreshSession', 'POST', '/api/session/refresh'),
  switchClub: endpoint<SwitchClubInput, SignedIn>('switchClub', 'POST', '/api/session/club'),
  signOut: endpoint<Nothing, Nothing>('signOut', 'DELETE', '/api/session'),
  changePictures: endpoint<PictureSettings, PictureSettings>('changePictures', 'PUT', '/api/pictures'),

  ledger: endpoint<LedgerInput, LedgerView>('ledger', 'GET', '/api/ledger'),
  ledgerCases: endpoint<LedgerCasesInput, LedgerCasesView>('ledgerCases', 'GET', '/api/ledger/cases'),

  today: endpoint<Nothing, TodayView>('today', 'GET', '/api/today'),
  answer: endpoint<AnswersInput, AnswersResult>('answer', 'POST', '/api/today/answers'),
  misTap: endpoint<MisTapInput, TodayView>('misTap', 'POST', '/api/today/mis-taps'),
  myCases: endpoint<Nothing, MyCasesView>('myCases', 'GET', '/api/cases'),
  myCase: endpoint<{ key: string }, MyCaseView>('myCase', 'GET', '/api/cases/:key'),
  form: endpoint<Nothing, FormView>('form', 'GET', '/api/form'),
  club: endpoint<Nothing, ClubView>('club', 'GET', '/api/club'),
  changeSettings: endpoint<MemberSettings, MemberSettings>('changeSettings', 'PUT', '/api/settings'),

  squad: endpoint<{ setKey?: string }, SquadView>('squad', 'GET', '/api/desk/squad'),
  memberPage: endpoint<{ memberId: string }, MemberPageView>(
    'memberPage',
    'GET',
    '/api/desk/members/:memberId',
  ),
  standings: endpoint<{ setKey?: string }, StandingsView>('standings', 'GET', '/api/desk/standings'),
  programme: endpoint<Nothing, ProgrammeView>('programme', 'GET', '/api/desk/programme'),
  assignSet: endpoint<AssignSetInput, ProgrammeView>('assignSet', 'PUT', '/api/desk/programme/:setKey'),
  withdrawSet: endpoint<WithdrawSetInput, ProgrammeView>(
    'withdrawSet',
    'DELETE',
    '/api/desk/programme/:setKey',
  ),

  previewSet: endpoint<PreviewSetInput, SetPreview>('previewSet', 'GET', '/api/case-set-preview'),
  defineSet: endpoint<DefineSetInput, { setKey: string }>('defineSet', 'POST', '/api/case-sets'),
  retireSet: endpoint<{ setKey: string }, Nothing>('retireSet', 'DELETE', '/api/case-sets/:setKey'),
  caseChoices: endpoint<{ setKey: string }, CaseChoices>(
    'caseChoices',
    'GET',
    '/api/case-sets/:setKey/choices',
  ),
  setAlias: endpoint<SetAliasInput, { alias: string | null }>('setAlias', 'PUT', '/api/aliases/:setKey/:key'),
  clearAlias: endpoint<{ setKey: string; key: string }, { alias: string | null }>(
    'clearAlias',
    'DELETE',
    '/api/aliases/:setKey/:key',
  ),

  intake: endpoint<Nothing, IntakeView>('intake', 'GET', '/api/admin/intake'),
  upload: endpoint<UploadInput, { draftId: string }>('upload', 'POST', '/api/admin/intake'),
  draft: endpoint<{ draftId: string }, DraftView>('draft', 'GET', '/api/admin/intake/:draftId'),
  settleLine: endpoint<SettleLineInput, DraftView>(
    'settleLine',
    'PATCH',
    '/api/admin/intake/:draftId/lines/:line',
  ),
  publish: endpoint<PublishInput, { setKey: string; edition: number }>(
    'publish',
    'POST',
    '/api/admin/intake/:draftId/publish',
  ),
  discard: endpoint<DiscardInput, IntakeView>('discard', 'POST', '/api/admin/intake/:draftId/discard'),

  catalogue: endpoint<Nothing, CatalogueView>('catalogue', 'GET', '/api/catalogue'),
  catalogueSet: endpoint<CatalogueSetInput, CatalogueSetView>(
    'catalogueSet',
    'GET',
    '/api/catalogue/sets/:setKey',
  ),
  catalogueCases: endpoint<CatalogueCasesInput, CatalogueCasesView>(
    'catalogueCases',
    'GET',
    '/api/catalogue/sets/:setKey/cases',
  ),
  catalogueCase: endpoint<CatalogueCaseInput, CatalogueCaseView>(
    'catalogueCase',
    'GET',
    '/api/catalogue/sets/:setKey/cases/:caseKey',
  ),
  catalogueSheet: endpoint<CatalogueSheetInput, CatalogueSheetView>(
    'catalogueSheet',
    'GET',
    '/api/catalogue/sets/:setKey/sheet',
  ),
  catalogueSearch: endpoint<SearchInput, SearchView>('catalogueSearch', 'GET', '/api/catalogue/search'),
  catalogueDrawn: endpoint<DrawnInput, DrawnView>('catalogueDrawn', 'GET', '/api/catalogue/drawn'),
  catalogueConfusable: endpoint<CatalogueCaseInput, ConfusableView>(
    'catalogueConfusable',
    'GET',
    '/api/catalogue/sets/:setKey/cases/:caseKey/confusable',
  ),
  edition: endpoint<{ setKey: string; number: number }, EditionView>(
    'edition',
    'GET',
    '/api/catalogue/sets/:setKey/editions/:number',
  ),
} as const;

export type Endpoints = typeof endpoints;
export type EndpointName = keyof Endpoints;
