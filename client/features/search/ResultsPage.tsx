import { useTitle } from "../../lib/useTitle";

export function ResultsPage() {
  useTitle("Parts that may fit");
  return (
    <div className="page py-10">
      <h1>Parts that may fit</h1>
    </div>
  );
}
