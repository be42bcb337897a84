export {
	makeTill,
	type CheckoutWanted,
	type PaymentEvent,
	type RefundWanted,
	type Till
} from './till';
