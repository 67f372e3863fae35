import { LinkTabs } from "@/components/layout/link-tabs";
import { paths } from "@/lib/domain/shared/paths";

const PAGES = [
  { href: paths.settings, label: "Company" },
  { href: paths.deliveries, label: "Failed deliveries" },
];

export default function SettingsLayout({ children }: LayoutProps<"/settings">) {
  return (
    <>
      <LinkTabs label="Settings" items={PAGES} />
      {children}
    </>
  );
}
