/** Every address of the product, built in one place. */
export const paths = {
  home: "/",
  signIn: "/sign-in",
  forgot: "/forgot",
  invitation: (token: string) => `/invitation/${token}`,
  passwordReset: (token: string) => `/reset/${token}`,
  account: "/account",
  overview: "/overview",
  runSheet: (date?: string) => (date ? `/run-sheet?date=${date}` : "/run-sheet"),
  people: "/people",
  person: (id: string) => `/people/${id}`,
  customers: "/customers",
  customer: (id: string) => `/customers/${id}`,
  sites: "/sites",
  site: (id: string) => `/sites/${id}`,
  jobs: "/jobs",
  job: (id: string) => `/jobs/${id}`,
  audit: "/audit",
  settings: "/settings",
  deliveries: "/settings/deliveries",
  field: "/field",
  /** The same list as a file, with the filters and order of the address. */
  listFile: (list: "sites" | "customers" | "people" | "jobs" | "audit" | "settings/deliveries") =>
    `/${list}/export.csv`,
  portal: "/portal",
  portalSite: (id: string) => `/portal/sites/${id}`,
} as const;
