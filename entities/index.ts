export { Design, PARAMETERS_FORMAT, type CheckCounts } from './design';
export { Membership } from './membership';
export { RecordEntry } from './record-entry';
export { ShopItem } from './shop-item';
export { User } from './user';
export { Workshop } from './workshop';
