"use client";

import { tabBarLook, tabLook } from "@/components/ui/tabs";

const SITE_SECTIONS = {
  place: "Place",
  people: "People",
  windows: "Test windows",
  access: "Access",
  systems: "Systems",
  papers: "Documents",
  work: "Jobs and visits",
} as const;

/** Leads to the parts of a long page; stays in reach while it scrolls. */
export function SiteNav() {
  return (
    <nav aria-label="On this page" data-print="off" className="sticky top-14 z-10 -mx-4 min-w-0 bg-ground px-4">
      <ul className={tabBarLook}>
        {Object.entries(SITE_SECTIONS).map(([id, word]) => (
          <li key={id}>
            <a href={`#${id}`} className={`${tabLook} -outline-offset-3`}>
              {word}
            </a>
          </li>
        ))}
      </ul>
    </nav>
  );
}

/** A part of the page that the bar above leads to. */
export const SitePart = ({ id, children }: { id: keyof typeof SITE_SECTIONS; children: React.ReactNode }) => (
  <div id={id} className="grid min-w-0 scroll-mt-28 grid-cols-1 gap-5">
    {children}
  </div>
);
