"use client";

import { X } from "lucide-react";
import { AlertDialog as AlertParts, Dialog as Parts } from "radix-ui";
import { Button, IconButton } from "./button";
import { cn } from "./cn";

const veil = "fixed inset-0 z-40 bg-veil";
const panel = "fixed z-50 grid gap-4 overflow-y-auto border border-line bg-surface p-5 shadow-xl outline-none";
const middle = "inset-x-4 top-[12vh] mx-auto max-h-[80vh] max-w-lg rounded-lg";

export const Dialog = Parts.Root;
export const DialogTrigger = Parts.Trigger;
export const DialogClose = Parts.Close;

type ContentProps = React.ComponentProps<typeof Parts.Content> & {
  title: string;
  description?: React.ReactNode;
  /** Read out, not shown: for a dialog whose first field says what it is. */
  titleHidden?: boolean;
};

function DialogHead({ title, titleHidden, description }: Pick<ContentProps, "title" | "titleHidden" | "description">) {
  return (
    <div className={titleHidden ? "sr-only" : "grid gap-1 pr-10"}>
      <Parts.Title className="text-lg font-bold">{title}</Parts.Title>
      {description && <Parts.Description className="text-muted">{description}</Parts.Description>}
    </div>
  );
}

function DialogPanel({ title, titleHidden, description, className, children, ...props }: ContentProps) {
  return (
    <Parts.Portal>
      <Parts.Overlay className={veil} data-print="off" />
      <Parts.Content
        className={cn(panel, className)}
        {...(!description && { "aria-describedby": undefined })}
        {...props}
      >
        <DialogHead title={title} titleHidden={titleHidden} description={description} />
        {children}
        {!titleHidden && (
          <Parts.Close asChild>
            <IconButton label="Close" size="normal" className="absolute top-3 right-3">
              <X aria-hidden className="size-5" />
            </IconButton>
          </Parts.Close>
        )}
      </Parts.Content>
    </Parts.Portal>
  );
}

export function DialogContent({ className, ...props }: ContentProps) {
  return <DialogPanel data-slot="dialog" className={cn(middle, className)} {...props} />;
}

const SIDES = {
  left: "inset-y-0 left-0 w-80 max-w-[85vw] border-y-0 border-l-0",
  right: "inset-y-0 right-0 w-md max-w-[92vw] border-y-0 border-r-0",
  bottom:
    "inset-x-0 bottom-0 max-h-[85dvh] rounded-t-xl border-x-0 border-b-0 pb-[max(1.25rem,env(safe-area-inset-bottom))]",
} as const;

/** A dialog at an edge: details beside a list, or the phone's drawer. */
export function SheetContent({ side = "right", className, ...props }: ContentProps & { side?: keyof typeof SIDES }) {
  return <DialogPanel data-slot="sheet" className={cn("content-start", SIDES[side], className)} {...props} />;
}

export function DialogActions({ className, ...props }: React.ComponentProps<"div">) {
  return <div className={cn("flex flex-wrap justify-end gap-2", className)} {...props} />;
}

type ConfirmProps = {
  trigger: React.ReactElement;
  title: string;
  description: React.ReactNode;
  /** The verb itself: "Cancel the visit", never "OK". */
  confirm: string;
  keep?: string;
  onConfirm: () => void;
};

/** Asks before a step that cannot be undone; what keeps things as they are has the focus. */
export function ConfirmDialog({ trigger, title, description, confirm, keep = "Keep it", onConfirm }: ConfirmProps) {
  return (
    <AlertParts.Root>
      <AlertParts.Trigger asChild>{trigger}</AlertParts.Trigger>
      <AlertParts.Portal>
        <AlertParts.Overlay className={veil} />
        <AlertParts.Content data-slot="confirm" className={cn(panel, middle, "max-w-md")}>
          <AlertParts.Title className="text-lg font-bold">{title}</AlertParts.Title>
          <AlertParts.Description className="text-muted">{description}</AlertParts.Description>
          <DialogActions>
            <AlertParts.Cancel asChild>
              <Button>{keep}</Button>
            </AlertParts.Cancel>
            <AlertParts.Action asChild>
              <Button variant="danger" onClick={onConfirm}>
                {confirm}
              </Button>
            </AlertParts.Action>
          </DialogActions>
        </AlertParts.Content>
      </AlertParts.Portal>
    </AlertParts.Root>
  );
}
