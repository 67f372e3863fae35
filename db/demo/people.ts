import type { StaffRole } from "@/lib/domain/shared/roles";

/** One password for every demo account: shown on the sign-in page, in demo mode only. */
export const DEMO_PASSWORD = "coast-down-demo";

export const DEMO_COMPANY = {
  companyId: "01936f00-0000-7000-8000-00000000c0a5",
  name: "Stillwater Alarm Service",
  phone: "360-555-0100",
  street: "18 Netmakers Row",
  city: "Port Ansel",
  state: "WA",
  postalCode: "98599",
  zone: "America/Los_Angeles",
  ownerName: "Marisol Etxeberria",
  ownerEmail: "marisol@stillwater.example",
} as const;

type DemoPerson = { name: string; email: string; role: StaffRole; phone: string };

export const OFFICE_PEOPLE: readonly DemoPerson[] = [
  { name: "Ansel Okafor", email: "ansel@stillwater.example", role: "dispatcher", phone: "360-555-0101" },
  { name: "Priya Lindqvist", email: "priya@stillwater.example", role: "dispatcher", phone: "360-555-0102" },
  { name: "Tobias Nakai", email: "tobias@stillwater.example", role: "bookkeeper", phone: "360-555-0103" },
];

export type DemoTechnician = {
  name: string;
  mail: string;
  street: string;
  city: string;
  latitude: number;
  longitude: number;
  /** Days from today until the license ends; some are about to, one has. */
  licenseDays: number;
};

export const TECHNICIANS: readonly DemoTechnician[] = [
  {
    name: "Dara Whitcomb",
    mail: "dara",
    street: "4 Rope Walk",
    city: "Port Ansel",
    latitude: 46.975,
    longitude: -123.81,
    licenseDays: 412,
  },
  {
    name: "Ignacio Bello",
    mail: "ignacio",
    street: "210 Gannet Street",
    city: "Port Ansel",
    latitude: 46.969,
    longitude: -123.83,
    licenseDays: 23,
  },
  {
    name: "Hollis Marchetti",
    mail: "hollis",
    street: "77 Cooperage Lane",
    city: "Millrace",
    latitude: 47.01,
    longitude: -123.4,
    licenseDays: 655,
  },
  {
    name: "Wren Abernathy",
    mail: "wren",
    street: "9 Sluice Road",
    city: "Millrace",
    latitude: 47.004,
    longitude: -123.41,
    licenseDays: 180,
  },
  {
    name: "Kofi Sandoval",
    mail: "kofi",
    street: "31 Larch Terrace",
    city: "Cedar Gap",
    latitude: 46.66,
    longitude: -122.97,
    licenseDays: 51,
  },
  {
    name: "June Pelletier",
    mail: "june",
    street: "502 Orchard Bench",
    city: "Cedar Gap",
    latitude: 46.668,
    longitude: -122.96,
    licenseDays: 300,
  },
  {
    name: "Mattias Rourke",
    mail: "mattias",
    street: "12 Beacon Hill Court",
    city: "Westering",
    latitude: 46.89,
    longitude: -124.1,
    licenseDays: 240,
  },
  {
    name: "Salome Vantongeren",
    mail: "salome",
    street: "88 Dunegrass Way",
    city: "Westering",
    latitude: 46.896,
    longitude: -124.11,
    licenseDays: -6,
  },
  {
    name: "Ezra Kalani",
    mail: "ezra",
    street: "140 Foundry Street",
    city: "Lanternford",
    latitude: 47.24,
    longitude: -123.1,
    licenseDays: 505,
  },
  {
    name: "Nadia Ferrum",
    mail: "nadia",
    street: "6 Weighbridge Yard",
    city: "Lanternford",
    latitude: 47.235,
    longitude: -123.11,
    licenseDays: 88,
  },
  {
    name: "Otis Grayling",
    mail: "otis",
    street: "23 Heron Slip",
    city: "Port Ansel",
    latitude: 46.98,
    longitude: -123.79,
    licenseDays: 365,
  },
  {
    name: "Yuki Thorne",
    mail: "yuki",
    street: "301 Tamarack Drive",
    city: "Cedar Gap",
    latitude: 46.671,
    longitude: -122.98,
    licenseDays: 720,
  },
];
