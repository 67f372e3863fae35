"use client";

import Link from "next/link";
import { usePathname } from "next/navigation";
import { cn } from "@/components/ui/cn";
import { tabBarLook, tabLook } from "@/components/ui/tabs";

/** Sibling pages of one thing, each with an address of its own. */
export function LinkTabs({ label, items }: { label: string; items: readonly { href: string; label: string }[] }) {
  const path = usePathname();
  return (
    <nav aria-label={label} data-print="off" className="min-w-0">
      <ul className={tabBarLook}>
        {items.map(({ href, label }) => (
          <li key={href}>
            <Link
              href={href}
              aria-current={path === href ? "page" : undefined}
              className={cn(tabLook, "-outline-offset-3")}
            >
              {label}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
