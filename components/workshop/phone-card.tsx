"use client";

import { useEffect, useState, useSyncExternalStore } from "react";
import { useServiceWorker } from "@/components/frame/use-service-worker";
import { Button } from "@/components/ui/button";
import { Card, CardHead } from "@/components/ui/card";
import { install, installState, subscribeInstall } from "@/lib/workshop/install-offer";
import { isRoomShort, roomWords } from "@/lib/workshop/room-words";
import { askToStay, lookAtStorage, type PhoneRoom } from "@/lib/workshop/storage";

/** What this phone does for the book: without data, among its apps, never thrown away, and with how much room. */
export function PhoneCard() {
  return (
    <Card aria-labelledby="phone-title">
      <CardHead title="This phone" id="phone-title" />
      <div className="grid grid-cols-[minmax(0,1fr)] gap-5">
        <WithoutData />
        <AmongTheApps />
        <Staying />
      </div>
    </Card>
  );
}

const offline = {
  off: "This browser cannot work without data here.",
  getting: "Getting ready: stay on the line for a moment.",
  ready: "Every screen is on this phone. Aeroplane mode is fine.",
  failed: "Not ready yet. Open Notchbook once more with data on.",
};

function WithoutData() {
  const { phase } = useServiceWorker();
  return (
    <section className="grid grid-cols-[minmax(0,1fr)] gap-1">
      <h3 className="font-semibold">Without data</h3>
      <p role="status">{offline[phase]}</p>
    </section>
  );
}

function AmongTheApps() {
  const state = useSyncExternalStore(subscribeInstall, installState, () => "by-hand" as const);
  return (
    <section className="grid grid-cols-[minmax(0,1fr)] gap-2">
      <h3 className="font-semibold">Among the phone’s apps</h3>
      {state === "installed" && <p>Notchbook is installed on this phone.</p>}
      {state === "offered" && (
        <Button className="justify-self-start" onClick={() => void install()}>
          Install Notchbook
        </Button>
      )}
      {state === "by-hand" && (
        <p>
          Open the browser’s menu (three dots, or the share sign) and choose “Install app” or “Add to home
          screen”. It then opens like any other app.
        </p>
      )}
    </section>
  );
}

const staying = {
  stays: "The browser has promised to keep the book even when the phone is short of room.",
  "may-go":
    "The browser may throw the book away if the phone runs out of room. Installing Notchbook usually ends that; saved copies guard against it.",
  unknown:
    "This browser does not say whether it keeps the book when the phone is short of room. Save copies.",
};

function Staying() {
  const [room, setRoom] = useState<PhoneRoom | null>(null);
  const [asked, setAsked] = useState(false);
  useEffect(() => {
    let current = true;
    void lookAtStorage().then((found) => current && setRoom(found));
    return () => {
      current = false;
    };
  }, [asked]);
  if (!room) return null;
  return (
    <section className="grid grid-cols-[minmax(0,1fr)] gap-2">
      <h3 className="font-semibold">Room</h3>
      <p role="status">{staying[room.staying]}</p>
      {room.staying === "may-go" && (
        <Button className="justify-self-start" onClick={() => void askToStay().then(() => setAsked(true))}>
          {asked ? "Ask the browser again" : "Ask the browser to keep it"}
        </Button>
      )}
      <p>{roomWords(room.usage, room.quota)}</p>
      {isRoomShort(room.usage, room.quota) && (
        <p className="font-semibold text-thread">
          That is little: delete photos or apps that you do not need.
        </p>
      )}
    </section>
  );
}
