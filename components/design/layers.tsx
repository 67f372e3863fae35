"use client";

import { Button } from "@/components/ui/button";
import {
  ConfirmDialog,
  Dialog,
  DialogActions,
  DialogClose,
  DialogContent,
  DialogTrigger,
  SheetContent,
} from "@/components/ui/dialog";
import {
  DropdownMenu,
  DropdownMenuContent,
  DropdownMenuItem,
  DropdownMenuLabel,
  DropdownMenuSeparator,
  DropdownMenuTrigger,
} from "@/components/ui/dropdown-menu";
import { Popover, PopoverContent, PopoverTrigger } from "@/components/ui/popover";
import { Tabs, TabsContent, TabsList, TabsTrigger } from "@/components/ui/tabs";
import { Tooltip } from "@/components/ui/tooltip";
import { Group } from "./group";

export function Layers() {
  return (
    <>
      <Group title="What opens above the page">
        <Dialog>
          <DialogTrigger asChild>
            <Button>Dialog</Button>
          </DialogTrigger>
          <DialogContent title="A dialog" description="Asks one thing.">
            <DialogActions>
              <DialogClose asChild>
                <Button>Close</Button>
              </DialogClose>
            </DialogActions>
          </DialogContent>
        </Dialog>
        <Dialog>
          <DialogTrigger asChild>
            <Button>Sheet</Button>
          </DialogTrigger>
          <SheetContent title="A sheet" description="Shows more beside the page." />
        </Dialog>
        <ConfirmDialog
          trigger={<Button variant="danger">Confirm</Button>}
          title="End access?"
          description="It takes effect at once."
          confirm="End access"
          onConfirm={() => {}}
        />
        <Popover>
          <PopoverTrigger asChild>
            <Button>Popover</Button>
          </PopoverTrigger>
          <PopoverContent>Something about the thing beside it.</PopoverContent>
        </Popover>
        <DropdownMenu>
          <DropdownMenuTrigger asChild>
            <Button>Menu</Button>
          </DropdownMenuTrigger>
          <DropdownMenuContent>
            <DropdownMenuLabel>Visit</DropdownMenuLabel>
            <DropdownMenuItem>Move</DropdownMenuItem>
            <DropdownMenuSeparator />
            <DropdownMenuItem danger>Cancel</DropdownMenuItem>
          </DropdownMenuContent>
        </DropdownMenu>
        <Tooltip text="A few words more">
          <Button>Tip</Button>
        </Tooltip>
      </Group>
      <Group title="Tabs">
        <Tabs defaultValue="points" className="w-full">
          <TabsList aria-label="Parts of a system">
            <TabsTrigger value="points">Points</TabsTrigger>
            <TabsTrigger value="outputs">Outputs</TabsTrigger>
            <TabsTrigger value="matrix" disabled>
              Matrix
            </TabsTrigger>
          </TabsList>
          <TabsContent value="points">Smoke detector, second floor</TabsContent>
          <TabsContent value="outputs">Relay of the supply fan</TabsContent>
        </Tabs>
      </Group>
    </>
  );
}
