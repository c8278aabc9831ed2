import type { RoleName } from '../tables';

/** An account of the demo; never made in a real deployment. */
export interface DemoAccount {
  readonly email: string;
  readonly name: string;
  readonly password: string;
  readonly role: RoleName;
  /** Slug of the show it belongs to. */
  readonly show: string;
}

/** The demo's accounts, in the order the start command prints them. */
export const demoAccounts: readonly DemoAccount[] = [
  {
    email: 'rigger@tidewrack.example',
    name: 'Brid Sallow',
    password: 'samphire-rope-41',
    role: 'rigger',
    show: 'saltmarsh_post',
  },
  {
    email: 'reviewer@tidewrack.example',
    name: 'Osric Fenn',
    password: 'lantern-creek-52',
    role: 'reviewer',
    show: 'saltmarsh_post',
  },
  {
    email: 'operator@tidewrack.example',
    name: 'Maud Sluice',
    password: 'ebb-and-neap-63',
    role: 'operator',
    show: 'saltmarsh_post',
  },
  {
    email: 'viewer@tidewrack.example',
    name: 'Tam Curlew',
    password: 'mudflat-kite-74',
    role: 'viewer',
    show: 'saltmarsh_post',
  },
  {
    email: 'admin@tidewrack.example',
    name: 'Ada Groyne',
    password: 'harbour-bell-85',
    role: 'admin',
    show: 'saltmarsh_post',
  },
  {
    email: 'neighbour@tidewrack.example',
    name: 'Wyn Marram',
    password: 'driftwood-ark-96',
    role: 'rigger',
    show: 'night_ferry',
  },
];

/** The demo's shows. The second one proves that nobody sees into a show they do not belong to. */
export const demoShows: readonly { readonly slug: string; readonly title: string }[] = [
  { slug: 'saltmarsh_post', title: 'The Saltmarsh Post' },
  { slug: 'night_ferry', title: 'Night Ferry' },
];
