/** Style sheets are imported for their effect: webpack extracts them into one file per page. */
declare module "*.css";
