import { PageHeader } from "@/ui/layout/page-header";

export default function TodayPage() {
  return <PageHeader title="Today" />;
}
