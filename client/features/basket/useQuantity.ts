import { useEffect, useRef, useState } from "react";
import type { BasketLine } from "#shared/schemas/basket";
import { announce } from "../../lib/announcements";
import { readQuantity, usePutLine } from "./api";

/** How long typing may pause before it is taken as meant, ms. */
const pause = 400;

const means = (text: string, quantity: number) => {
  const read = readQuantity(text);
  return read.ok && read.quantity === quantity;
};

/**
 * The quantity of a line while it is being changed. What is typed stays as it was typed until the server has taken it over,
 * also where it was refused. A change that waits is sent when its field goes away.
 */
export function useQuantity({ part, quantity }: BasketLine, shipTo: string) {
  const put = usePutLine(shipTo);
  const [typed, setTyped] = useState<string | null>(null);
  const [refusal, setRefusal] = useState<string | null>(null);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  /** What the server was asked for last; null after a refusal. */
  const asked = useRef<number | null>(quantity);
  const underWay = useRef(0);
  useEffect(() => {
    if (underWay.current === 0 && asked.current !== null) asked.current = quantity;
  }, [quantity]);

  const stopWaiting = () => {
    clearTimeout(timer.current);
    timer.current = undefined;
  };
  const send = async (text: string) => {
    stopWaiting();
    const wanted = readQuantity(text);
    if (!wanted.ok) return;
    if (wanted.quantity === asked.current) {
      if (underWay.current === 0) setTyped(null);
      return;
    }
    asked.current = wanted.quantity;
    underWay.current += 1;
    try {
      await put.mutateAsync({ partId: part.id, quantity: wanted.quantity });
      setTyped((now) => (now !== null && means(now, wanted.quantity) ? null : now));
      announce(`${wanted.quantity} of ${part.title}`);
    } catch (error) {
      // A later wish has its own answer.
      if (asked.current !== wanted.quantity) return;
      asked.current = null;
      setRefusal(error instanceof Error ? error.message : "It could not be changed");
    } finally {
      underWay.current -= 1;
    }
  };
  const change = (text: string) => {
    stopWaiting();
    setTyped(text);
    setRefusal(null);
    timer.current = setTimeout(() => void send(text), pause);
  };
  const sendNow = () => {
    if (timer.current !== undefined && typed !== null) void send(typed);
  };
  const latest = useRef(sendNow);
  latest.current = sendNow;
  useEffect(() => () => latest.current(), []);

  const read = typed === null ? null : readQuantity(typed);
  const current = read?.ok ? read.quantity : quantity;
  return {
    text: typed ?? String(quantity),
    message: read && !read.ok ? read.message : refusal,
    mayRetry: refusal !== null && read?.ok === true,
    isPending: put.isPending,
    change,
    step: (by: number) => change(String(Math.min(99, Math.max(1, current + by)))),
    sendNow,
    retry: () => {
      setRefusal(null);
      if (typed !== null) void send(typed);
    },
    stopWaiting,
  };
}
