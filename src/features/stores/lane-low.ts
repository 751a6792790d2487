/** A lane under this share of full is low (common practice, no published source). */
const lowShare = 0.25;

export const isLow = ({ pounds, capacityPounds }: { pounds: number; capacityPounds: number }): boolean => pounds < lowShare * capacityPounds;
