import type { ParcelStep } from "#shared/domain/parcelSteps";
import type { DispatchParcel, WorkshopParcel } from "#shared/schemas/workshopParcel";
import { announce } from "../../lib/announcements";
import { formatDay } from "../../lib/formatDate";
import { Button } from "../../ui/Button";
import { FailureNotice } from "../../ui/FailureNotice";
import { useParcelStep } from "./api";
import { DispatchForm } from "./DispatchForm";
import { dueOf, stepNames, workshopParcelWords } from "./parcelWords";

/** A second press this soon, ms, was meant for the step before: the button of the next one stands in its place. */
const pressedTwice = 1_000;

/** "It left on 3 December 2026, carried by Harbour Post, tracking number HP 12." */
function leftWords({ dispatchedAt, carrier, trackingNumber }: WorkshopParcel): string | null {
  if (!dispatchedAt) return null;
  const how = [carrier && `carried by ${carrier}`, trackingNumber && `tracking number ${trackingNumber}`];
  return `${[`It left on ${formatDay(dispatchedAt)}`, ...how.filter(Boolean)].join(", ")}.`;
}

/** Where a parcel stands, by when it must leave, and the step that its workshop takes next. */
export function NextStep({ parcel }: { parcel: WorkshopParcel }) {
  const take = useParcelStep(parcel.id);
  const { name, next } = workshopParcelWords[parcel.state];
  const due = dueOf(parcel, new Date());
  const left = leftWords(parcel);
  const said = ({ state }: WorkshopParcel) =>
    announce(`${workshopParcelWords[state].name}: order ${parcel.orderNumber}`);

  const press = (step: ParcelStep) => {
    if (Date.now() - take.submittedAt < pressedTwice) return;
    take.mutate({ step }, { onSuccess: said });
  };
  const dispatch = async (details: DispatchParcel) => said(await take.mutateAsync({ step: "dispatch", details }));

  return (
    <section aria-label="What to do next" className="grid gap-4 border-y border-rule bg-sheet px-5 py-5 print:px-0">
      <div className="grid gap-1">
        <p className="text-step2 font-bold">{name}</p>
        <p className="max-w-prose">{next}</p>
        {due && <p className={due.isLate ? "font-semibold text-outband" : "font-semibold"}>{due.words}</p>}
        {left && <p className="[overflow-wrap:anywhere]">{left}</p>}
      </div>
      {parcel.steps.map((step) => (
        <div key={step} className="print:hidden">
          {step === "dispatch" ? (
            <DispatchForm onDispatch={dispatch} />
          ) : (
            <Button look="primary" disabled={take.isPending} onClick={() => press(step)}>
              {stepNames[step]}
            </Button>
          )}
        </div>
      ))}
      {take.isError && take.variables.step !== "dispatch" && (
        <FailureNotice error={take.error} what="The parcel stays as it was" />
      )}
    </section>
  );
}
