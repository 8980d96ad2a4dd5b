import { useQuery } from "@tanstack/react-query";
import { useTitle } from "../../lib/useTitle";
import { FailureNotice } from "../../ui/FailureNotice";
import { Skeleton } from "../../ui/Skeleton";
import { settingsQuery } from "./api";
import { SettingsForm } from "./SettingsForm";

/** A workshop's own settings: words, postage and tax. */
export function WorkshopSettingsPage() {
  useTitle("Workshop settings");
  const settings = useQuery(settingsQuery);
  return (
    <div className="page grid grid-cols-1 gap-8 py-10">
      <header className="grid gap-1">
        <h1>Workshop settings</h1>
        {settings.data && <p className="text-step1 text-soft">{settings.data.workshop.name}</p>}
      </header>
      {settings.data && <SettingsForm page={settings.data} />}
      {settings.isPending && (
        <div role="status" className="grid gap-4">
          <span className="sr-only">Fetching the settings</span>
          <Skeleton className="h-40 w-full max-w-xl" />
          <Skeleton className="h-64 w-full max-w-xl" />
        </div>
      )}
      {settings.error && !settings.data && (
        <FailureNotice
          error={settings.error}
          what="The settings could not be fetched"
          onRetry={() => void settings.refetch()}
        />
      )}
    </div>
  );
}
