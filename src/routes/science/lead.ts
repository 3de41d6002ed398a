export const SCIENCE_LEAD =
  'Every formula behind a verdict: whose it is, how sure it is, where it does not hold, and what it gives with the figures of one link. A formula is in SG, °P, litres, SRM and °C; where you read other units, both stand.';
