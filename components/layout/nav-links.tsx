"use client";

import Link from "next/link";
import { usePathname } from "next/navigation";
import { cn } from "@/components/ui/cn";
import { NAV_ICONS, type NavIcon } from "./nav-icons";

export type NavItem = { href: string; label: string; icon?: NavIcon };

/** Here, or on a page below it; a sibling that only begins alike is another page. */
export const isHere = (path: string, href: string): boolean => {
  const page = href.split(/[?#]/)[0] ?? href;
  return path === page || path.startsWith(`${page}/`);
};

const LOOKS = {
  rail: "min-h-10 gap-3 rounded-md px-3 hover:bg-sunken aria-[current=page]:bg-sunken aria-[current=page]:font-bold aria-[current=page]:shadow-[inset_3px_0_0_var(--still)] pointer-coarse:min-h-12",
  bar: "h-full min-h-14 min-w-12 flex-col justify-center gap-0.5 px-1 text-sm text-muted aria-[current=page]:font-bold aria-[current=page]:text-text aria-[current=page]:shadow-[inset_0_3px_0_var(--still)]",
  row: "min-h-12 gap-2 px-3 text-muted hover:text-text aria-[current=page]:font-bold aria-[current=page]:text-text aria-[current=page]:shadow-[inset_0_-3px_0_var(--still)]",
} as const;

type NavLinksProps = {
  items: readonly NavItem[];
  look?: keyof typeof LOOKS;
  className?: string;
  onGo?: () => void;
  /** Stands after the last link, as another item. */
  children?: React.ReactNode;
};

export function NavLinks({ items, look = "rail", className, onGo, children }: NavLinksProps) {
  const path = usePathname();
  return (
    <ul className={className}>
      {items.map(({ href, label, icon }) => {
        const Icon = icon && NAV_ICONS[icon];
        return (
          <li key={href} className={look === "bar" ? "min-w-0 flex-1" : undefined}>
            <Link
              href={href}
              onClick={onGo}
              aria-current={isHere(path, href) ? "page" : undefined}
              className={cn("flex items-center -outline-offset-2", LOOKS[look])}
            >
              {Icon && <Icon aria-hidden className="size-5 shrink-0" />}
              <span className="truncate">{label}</span>
            </Link>
          </li>
        );
      })}
      {children}
    </ul>
  );
}
