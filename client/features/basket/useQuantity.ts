import { useEffect, useRef, useState } from "react";
import type { BasketLine } from "#shared/schemas/basket";
import { announce } from "../../lib/announcements";
import { readQuantity, usePutLine } from "./api";

/** How long typing may pause before it is taken as meant, ms. */
const pause = 400;

/**
 * The quantity of a line while it is being changed. What is typed stays as it was typed until the server has taken it over,
 * also where it was refused. A change that waits is sent when its field goes away.
 */
export function useQuantity({ part, quantity }: BasketLine, shipTo: string) {
  const put = usePutLine(shipTo);
  const [typed, setTyped] = useState<string | null>(null);
  const waiting = useRef<{ timer: ReturnType<typeof setTimeout>; send: () => void } | null>(null);
  const read = typed === null ? null : readQuantity(typed);

  const stopWaiting = () => {
    if (waiting.current) clearTimeout(waiting.current.timer);
    waiting.current = null;
  };
  const send = (text: string) => {
    stopWaiting();
    const wanted = readQuantity(text);
    if (!wanted.ok) return;
    if (wanted.quantity === quantity && !put.isPending) {
      setTyped(null);
      put.reset();
      return;
    }
    put.mutate(
      { partId: part.id, quantity: wanted.quantity },
      {
        onSuccess: () => {
          setTyped((now) => (now === text ? null : now));
          announce(`${wanted.quantity} of ${part.title}`);
        },
      },
    );
  };
  const change = (text: string) => {
    stopWaiting();
    setTyped(text);
    put.reset();
    waiting.current = { timer: setTimeout(() => send(text), pause), send: () => send(text) };
  };
  const sendNow = () => waiting.current?.send();

  const latest = useRef(sendNow);
  latest.current = sendNow;
  useEffect(() => () => latest.current(), []);

  const message = read && !read.ok ? read.message : (put.error?.message ?? null);
  return {
    text: typed ?? String(quantity),
    message,
    /** Refused by the server or unreachable: the same can be tried again. */
    mayRetry: put.isError && read?.ok === true,
    isPending: put.isPending,
    change,
    step: (by: number) => change(String(Math.min(99, Math.max(1, (read?.ok ? read.quantity : quantity) + by)))),
    sendNow,
    retry: () => typed !== null && send(typed),
    stopWaiting,
  };
}
