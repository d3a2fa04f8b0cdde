import { NextResponse } from "next/server";
import { sql } from "drizzle-orm";
import { serverDatabase } from "@/db/server/open";

export const dynamic = "force-dynamic";

/** Whether the server and its database answer; says plainly why not. */
export async function GET() {
  try {
    const { db } = await serverDatabase();
    await db.execute(sql`select 1`);
    return NextResponse.json({ status: "ok", build: process.env.NOTCHBOOK_BUILD_ID });
  } catch (error) {
    const say = error instanceof Error ? error.message : "The database does not open.";
    return NextResponse.json({ status: "failed", say }, { status: 503 });
  }
}
