/** A site as whoever picks up the telephone wants it: whom to call, who comes when, and what is open there. */
export type SiteBrief = {
  id: string;
  name: string;
  street: string;
  city: string;
  lastVisit: string | null;
  nextVisit: string | null;
  contacts: { id: string; name: string; title: string | null; phone: string | null; email: string | null }[];
  systems: { id: string; name: string }[];
  openJobs: { id: string; number: number; title: string; stateWords: string; waits: string[] }[];
  due: { itemId: string; words: string; latest: string; overdue: boolean }[];
};

/** What the one search answers. */
export type Found = {
  sites: SiteBrief[];
  customers: { id: string; name: string; phone: string | null }[];
  contacts: { id: string; name: string; phone: string | null; customerId: string }[];
  jobs: { id: string; number: number; title: string }[];
  people: { id: string; name: string; role: string }[];
};
