"use client";

import { ChevronDown, LogOut, UserRound } from "lucide-react";
import Link from "next/link";
import { startTransition } from "react";
import { Avatar } from "@/components/ui/avatar";
import { Button } from "@/components/ui/button";
import {
  DropdownMenu,
  DropdownMenuContent,
  DropdownMenuItem,
  DropdownMenuLabel,
  DropdownMenuRadioGroup,
  DropdownMenuRadioItem,
  DropdownMenuSeparator,
  DropdownMenuTrigger,
} from "@/components/ui/dropdown-menu";
import { paths } from "@/lib/domain/shared/paths";
import { THEMES, type ThemeChoice } from "./theme";
import { useTheme } from "./use-theme";

type PersonMenuProps = { personName: string; leave: () => Promise<void> };

export function PersonMenu({ personName, leave }: PersonMenuProps) {
  const [theme, choose] = useTheme();
  return (
    <DropdownMenu>
      <DropdownMenuTrigger asChild>
        <Button variant="plain" className="px-1.5" aria-label={`Menu of ${personName}`}>
          <Avatar name={personName} />
          <span className="max-md:sr-only">{personName}</span>
          <ChevronDown aria-hidden className="size-4 max-md:hidden" />
        </Button>
      </DropdownMenuTrigger>
      <DropdownMenuContent align="end">
        <DropdownMenuLabel>{personName}</DropdownMenuLabel>
        <DropdownMenuItem asChild>
          <Link href={paths.account}>
            <UserRound aria-hidden className="size-4" />
            Your account
          </Link>
        </DropdownMenuItem>
        <DropdownMenuSeparator />
        <DropdownMenuLabel>Appearance</DropdownMenuLabel>
        <DropdownMenuRadioGroup value={theme} onValueChange={(value) => choose(value as ThemeChoice)}>
          {THEMES.map(({ value, word }) => (
            <DropdownMenuRadioItem key={value} value={value}>
              {word}
            </DropdownMenuRadioItem>
          ))}
        </DropdownMenuRadioGroup>
        <DropdownMenuSeparator />
        <DropdownMenuItem onSelect={() => startTransition(leave)}>
          <LogOut aria-hidden className="size-4" />
          Sign out
        </DropdownMenuItem>
      </DropdownMenuContent>
    </DropdownMenu>
  );
}
