import type { RouteObject } from "react-router";

/** The sheets of what is on its way to publication. */
export const proposalRoutes: RouteObject[] = [];
