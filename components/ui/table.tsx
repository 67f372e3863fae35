import { cn } from "./cn";

export function Table({ className, ...props }: React.ComponentProps<"table">) {
  return (
    <div className="overflow-x-auto rounded-lg border border-line bg-surface" data-slot="table">
      <table
        className={cn("w-full border-collapse text-left [&_tbody_tr:last-child>*]:border-b-0", className)}
        {...props}
      />
    </div>
  );
}

export const Th = ({ className, ...props }: React.ComponentProps<"th">) => (
  <th
    scope="col"
    className={cn("border-b border-line px-3 py-2 text-sm font-semibold whitespace-nowrap text-muted", className)}
    {...props}
  />
);

export const Td = ({ className, ...props }: React.ComponentProps<"td">) => (
  <td className={cn("border-b border-line px-3 py-2 align-top", className)} {...props} />
);
