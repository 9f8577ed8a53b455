import { Tabs } from "@/ui/layout/tabs";

const tabs = [
  { href: "/settings", label: "The lab" },
  { href: "/settings/classes", label: "Tolerance classes" },
  { href: "/settings/fluids", label: "Fluids" },
];

export function SettingsTabs() {
  return <Tabs label="Settings" tabs={tabs} />;
}
