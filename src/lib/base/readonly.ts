/** The same type, read-only all the way down: what a schema hands out is never written to. */
export type DeepReadonly<T> = T extends (infer Item)[]
	? readonly DeepReadonly<Item>[]
	: T extends object
		? { readonly [Key in keyof T]: DeepReadonly<T[Key]> }
		: T;
