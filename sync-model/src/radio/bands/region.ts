/** The three regions of the Radio Regulations: 1 Europe, Africa, northern Asia; 2 the Americas; 3 the rest of Asia and Oceania. */
export type ItuRegion = 1 | 2 | 3;
