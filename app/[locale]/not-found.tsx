import { MissingNotice } from "@/components/site/missing-notice";

export default function NotFound() {
  return <MissingNotice />;
}
