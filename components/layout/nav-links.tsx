"use client";

import Link from "next/link";
import { usePathname } from "next/navigation";
import { cn } from "@/components/ui/cn";

export type NavItem = { href: string; label: string };

export function NavLinks({ items, className }: { items: readonly NavItem[]; className?: string }) {
  const path = usePathname();
  return (
    <ul className={className}>
      {items.map(({ href, label }) => {
        const here = path === href || path.startsWith(`${href}/`);
        return (
          <li key={href}>
            <Link
              href={href}
              aria-current={here ? "page" : undefined}
              className={cn(
                "flex min-h-10 items-center rounded-md px-3 whitespace-nowrap hover:bg-ground",
                here && "bg-ground font-bold shadow-[inset_3px_0_0_var(--still)]",
              )}
            >
              {label}
            </Link>
          </li>
        );
      })}
    </ul>
  );
}
