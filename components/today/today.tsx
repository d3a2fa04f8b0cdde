"use client";

import dynamic from "next/dynamic";

/** Fetched when it is shown: a first visit comes by here on its way to the start, and need not pay for it. */
export const Today = dynamic(() => import("./today-screen").then((module) => module.TodayScreen));
