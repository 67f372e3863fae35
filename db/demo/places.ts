import type { SiteKind } from "@/lib/domain/sites/words";

type DemoSite = { name: string; kind: SiteKind; street: string; access?: string };
export type DemoCustomer = {
  name: string;
  mail: string;
  contact: string;
  title: string;
  city: string;
  sites: readonly DemoSite[];
};

/** Where the invented towns would lie. */
export const CITIES: Record<string, { postalCode: string; latitude: number; longitude: number }> = {
  "Port Ansel": { postalCode: "98599", latitude: 46.975, longitude: -123.815 },
  Millrace: { postalCode: "98598", latitude: 47.008, longitude: -123.405 },
  "Cedar Gap": { postalCode: "98597", latitude: 46.665, longitude: -122.97 },
  Westering: { postalCode: "98596", latitude: 46.892, longitude: -124.105 },
  Lanternford: { postalCode: "98594", latitude: 47.238, longitude: -123.105 },
};

export const CUSTOMERS: readonly DemoCustomer[] = [
  {
    name: "Harbor Light Health",
    mail: "harborlight",
    contact: "Renata Oduya",
    title: "Facilities manager",
    city: "Port Ansel",
    sites: [
      {
        name: "Harbor Light Hospital, North Wing",
        kind: "hospital",
        street: "1 Infirmary Hill",
        access: "Sign in at the engineers' desk, level B1. Operating floors: ask before any fan stops.",
      },
      {
        name: "Harbor Light Hospital, Surgery Pavilion",
        kind: "hospital",
        street: "3 Infirmary Hill",
        access: "Escort by the building engineer on every visit.",
      },
      { name: "Harbor Light Imaging Center", kind: "hospital", street: "12 Infirmary Hill" },
      { name: "Harbor Light Laundry", kind: "other", street: "40 Lower Dock Road" },
    ],
  },
  {
    name: "Ansel Bay Cold Storage",
    mail: "anselcold",
    contact: "Viktor Haas",
    title: "Plant engineer",
    city: "Port Ansel",
    sites: [
      {
        name: "Cold Store No. 1",
        kind: "cold_store",
        street: "200 Pier Nine",
        access: "Evaporator fans may stand still for at most ten minutes.",
      },
      { name: "Cold Store No. 2", kind: "cold_store", street: "204 Pier Nine" },
      { name: "Blast Freezer House", kind: "cold_store", street: "210 Pier Nine" },
    ],
  },
  {
    name: "Port Ansel School District",
    mail: "pasd",
    contact: "Lorna Quist",
    title: "Director of buildings",
    city: "Port Ansel",
    sites: [
      { name: "Netmakers Elementary", kind: "school", street: "55 Netmakers Row" },
      { name: "Tidewater Middle School", kind: "school", street: "400 Gannet Street" },
      {
        name: "Port Ansel High School",
        kind: "school",
        street: "900 Gannet Street",
        access: "Visitor badge at the office; tests outside school hours only.",
      },
      { name: "District Kitchen and Stores", kind: "warehouse", street: "17 Depot Lane" },
    ],
  },
  {
    name: "The Lyric Playhouse Trust",
    mail: "lyric",
    contact: "Fenn Castellan",
    title: "House manager",
    city: "Port Ansel",
    sites: [
      {
        name: "Lyric Playhouse",
        kind: "theater",
        street: "8 Curtain Street",
        access: "Stage door, ring twice. Smoke vents over the stage: winch key at the fly floor.",
      },
      { name: "Lyric Scene Shop", kind: "warehouse", street: "10 Curtain Street" },
    ],
  },
  {
    name: "Kittering & Sons Cannery",
    mail: "kittering",
    contact: "Odalys Kittering",
    title: "Maintenance lead",
    city: "Westering",
    sites: [
      {
        name: "Kittering Cannery",
        kind: "cannery",
        street: "1 Cannery Wharf",
        access: "Wash-down area: boots and hair nets.",
      },
      { name: "Kittering Can Store", kind: "warehouse", street: "6 Cannery Wharf" },
    ],
  },
  {
    name: "Meridian Tower Associates",
    mail: "meridian",
    contact: "Jonah Albrecht",
    title: "Chief engineer",
    city: "Lanternford",
    sites: [
      {
        name: "Meridian Tower",
        kind: "office",
        street: "1000 Foundry Street",
        access: "Fire command center on the ground floor, key at the desk.",
      },
      { name: "Meridian Annex", kind: "office", street: "1020 Foundry Street" },
      { name: "Meridian Garage", kind: "other", street: "1040 Foundry Street" },
    ],
  },
  {
    name: "Tri-Town Library Cooperative",
    mail: "tritown",
    contact: "Beatrix Loomis",
    title: "Building supervisor",
    city: "Millrace",
    sites: [
      { name: "Millrace Library", kind: "library", street: "2 Sluice Road" },
      { name: "Cedar Gap Branch Library", kind: "library", street: "14 Larch Terrace" },
      {
        name: "Library Archive",
        kind: "library",
        street: "61 Cooperage Lane",
        access: "Agent-protected vault: do not enter without the archivist.",
      },
    ],
  },
  {
    name: "Cedar Gap Regional Courts",
    mail: "cgcourts",
    contact: "Amadou Wells",
    title: "Court administrator",
    city: "Cedar Gap",
    sites: [
      { name: "Courthouse", kind: "court", street: "100 Justice Square" },
      { name: "Courts Records Building", kind: "office", street: "120 Justice Square" },
    ],
  },
  {
    name: "Gannet House Hotels",
    mail: "gannet",
    contact: "Signe Marlow",
    title: "General manager",
    city: "Port Ansel",
    sites: [
      { name: "Gannet House", kind: "hotel", street: "77 Gannet Street", access: "Quiet hours 21:00 to 9:00." },
      { name: "Gannet Dunes Lodge", kind: "hotel", street: "5 Dunegrass Way" },
    ],
  },
  {
    name: "Brightseam Textiles",
    mail: "brightseam",
    contact: "Paolo Iversen",
    title: "Works manager",
    city: "Millrace",
    sites: [
      { name: "Brightseam Weaving Hall", kind: "warehouse", street: "30 Cooperage Lane" },
      { name: "Brightseam Dye House", kind: "other", street: "34 Cooperage Lane" },
    ],
  },
  {
    name: "Lanternford Polytechnic",
    mail: "lanternpoly",
    contact: "Hester Vance",
    title: "Safety officer",
    city: "Lanternford",
    sites: [
      {
        name: "Chemistry Building",
        kind: "laboratory",
        street: "1 College Rise",
        access: "Fume hoods: stop one unit at a time.",
      },
      { name: "Lecture Halls", kind: "school", street: "5 College Rise" },
      {
        name: "Animal Care Building",
        kind: "laboratory",
        street: "9 College Rise",
        access: "Air changes may not be interrupted for longer than fifteen minutes.",
      },
      { name: "Student Residences", kind: "apartments", street: "20 College Rise" },
    ],
  },
  {
    name: "Westering Parish",
    mail: "westparish",
    contact: "Colm Drury",
    title: "Sexton",
    city: "Westering",
    sites: [{ name: "Church of the Breakwater", kind: "worship", street: "3 Beacon Hill Court" }],
  },
  {
    name: "Orchard Bench Growers",
    mail: "orchard",
    contact: "Talia Roos",
    title: "Packing house manager",
    city: "Cedar Gap",
    sites: [
      { name: "Packing House", kind: "warehouse", street: "600 Orchard Bench" },
      {
        name: "Controlled Atmosphere Store",
        kind: "cold_store",
        street: "640 Orchard Bench",
        access: "Oxygen-poor rooms. Never enter alone.",
      },
    ],
  },
  {
    name: "Ironwood Property Group",
    mail: "ironwood",
    contact: "Desmond Achterberg",
    title: "Portfolio manager",
    city: "Lanternford",
    sites: [
      { name: "Weighbridge Lofts", kind: "apartments", street: "8 Weighbridge Yard" },
      { name: "Foundry Court", kind: "apartments", street: "300 Foundry Street" },
      { name: "Market Arcade", kind: "retail", street: "45 Market Street" },
      { name: "Signal House", kind: "office", street: "70 Market Street" },
    ],
  },
  {
    name: "Southspit Fisheries Museum",
    mail: "southspit",
    contact: "Greta Nilsson",
    title: "Curator",
    city: "Westering",
    sites: [
      { name: "Fisheries Museum", kind: "other", street: "20 Lighthouse Road" },
      { name: "Boat Hall", kind: "other", street: "24 Lighthouse Road" },
    ],
  },
  {
    name: "Cedar Gap Memorial Hospital",
    mail: "cgmemorial",
    contact: "Bram Oyelaran",
    title: "Plant operations",
    city: "Cedar Gap",
    sites: [
      { name: "Memorial Hospital, Main Building", kind: "hospital", street: "1 Memorial Way" },
      { name: "Memorial Clinic", kind: "hospital", street: "9 Memorial Way" },
    ],
  },
  {
    name: "Redcap Grocers",
    mail: "redcap",
    contact: "Nuala Pfeiffer",
    title: "Store operations",
    city: "Millrace",
    sites: [
      { name: "Redcap Market Millrace", kind: "retail", street: "88 Sluice Road" },
      { name: "Redcap Market Cedar Gap", kind: "retail", street: "210 Larch Terrace" },
      { name: "Redcap Distribution", kind: "warehouse", street: "4 Depot Loop" },
    ],
  },
  {
    name: "Larkspur Senior Living",
    mail: "larkspur",
    contact: "Ivo Santangelo",
    title: "Executive director",
    city: "Cedar Gap",
    sites: [
      { name: "Larkspur Commons", kind: "apartments", street: "15 Larkspur Lane" },
      {
        name: "Larkspur Memory Care",
        kind: "apartments",
        street: "17 Larkspur Lane",
        access: "Doors release on alarm: two staff at each exit.",
      },
    ],
  },
  {
    name: "Port of Ansel Authority",
    mail: "portansel",
    contact: "Magnus Teller",
    title: "Harbor engineer",
    city: "Port Ansel",
    sites: [
      { name: "Passenger Terminal", kind: "other", street: "1 Pier One" },
      { name: "Transit Shed 4", kind: "warehouse", street: "4 Pier One" },
      { name: "Port Offices", kind: "office", street: "9 Pier One" },
    ],
  },
  {
    name: "Cloverfield Dairy",
    mail: "cloverfield",
    contact: "Anneke Doyle",
    title: "Utilities lead",
    city: "Millrace",
    sites: [
      { name: "Creamery", kind: "other", street: "500 Valley Road" },
      { name: "Cheese Store", kind: "cold_store", street: "510 Valley Road" },
    ],
  },
  {
    name: "Vantage Data Halls",
    mail: "vantage",
    contact: "Rohan Beck",
    title: "Site operations",
    city: "Lanternford",
    sites: [
      {
        name: "Data Hall A",
        kind: "other",
        street: "1 Switchyard Road",
        access: "Clean agent in both rooms. Change ticket before any test.",
      },
      { name: "Data Hall B", kind: "other", street: "3 Switchyard Road" },
    ],
  },
  {
    name: "Starling Day Schools",
    mail: "starling",
    contact: "Imani Croft",
    title: "Head of estates",
    city: "Westering",
    sites: [
      { name: "Starling School Westering", kind: "school", street: "12 Dunegrass Way" },
      { name: "Starling School Lanternford", kind: "school", street: "55 Tinsmith Street" },
    ],
  },
  {
    name: "Alder & Fitch Attorneys",
    mail: "alderfitch",
    contact: "Corwin Fitch",
    title: "Office manager",
    city: "Cedar Gap",
    sites: [{ name: "Alder & Fitch Offices", kind: "office", street: "90 Justice Square" }],
  },
  {
    name: "Quayside Apartments Association",
    mail: "quayside",
    contact: "Leocadia Brandt",
    title: "Association president",
    city: "Port Ansel",
    sites: [
      { name: "Quayside East", kind: "apartments", street: "30 Lower Dock Road" },
      { name: "Quayside West", kind: "apartments", street: "34 Lower Dock Road" },
    ],
  },
  {
    name: "Millrace Ice & Sports",
    mail: "millraceice",
    contact: "Stellan Moreau",
    title: "Arena manager",
    city: "Millrace",
    sites: [
      {
        name: "Millrace Arena",
        kind: "other",
        street: "1 Arena Road",
        access: "Ammonia plant: gas warning at the machine room door.",
      },
    ],
  },
];
