import type { RouteObject } from "react-router";

/** Signing in and out, and one's own account. */
export const memberRoutes: RouteObject[] = [];
