/** A web address inside plain text; brackets around it are not part of it. */
export const LINK = /https?:\/\/[^\s<>"'[\](){}]+/g;
