import { Page, PageHeader } from "~/components/page";

export default function Desk() {
  return (
    <Page>
      <PageHeader title="Desk" large />
    </Page>
  );
}
