/** What the one search answers. */
export type Found = {
  sites: {
    id: string;
    name: string;
    street: string;
    city: string;
    lastVisit: string | null;
    nextVisit: string | null;
    contacts: { name: string; phone: string | null }[];
  }[];
  customers: { id: string; name: string; phone: string | null }[];
  contacts: { id: string; name: string; phone: string | null; customerId: string }[];
  jobs: { id: string; number: number; title: string; siteId: string }[];
  people: { id: string; name: string; role: string }[];
};
