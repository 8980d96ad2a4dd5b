import { useTitle } from "../../lib/useTitle";

export function HomePage() {
  useTitle(null);
  return (
    <div className="page py-10">
      <h1>Find a part by its size</h1>
    </div>
  );
}
