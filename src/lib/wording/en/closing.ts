/** The last sheets: signatures, how to check, cautions; and what the attached files are. */
export const CLOSING = {
	'sign.sheet': 'Signatures',
	'sign.caption': 'Closing signatures; each signs every byte of this file up to it',
	'sign.field': '{meaning}: {roles}',
	'sign.not signed': 'Not signed',
	'sign.hold points': 'Hold points signed during the work',
	'sign.meaning': 'Meaning',
	'sign.person': 'Person',
	'sign.role': 'Role',
	'sign.code': 'Code of the statement',
	'check.title': 'How to check this file',
	'check.reader':
		'Any reader of PDF signatures shows who signed and whether a byte was changed after each signature. It shows the signers as trusted once the site root, attached as root.pem and compared with the site by another way, is added there.',
	'check.count':
		'A reader does not see that a last signature was cut off, nor a change made before a later signature: {signatures} signatures belong here, and the last one locks the file.',
	'check.root':
		'On a command line: import root.pem with certutil and run pdfsig; the container is plain PDF, and qpdf lists its attachments. The record is record.ndjson: one event a line, each with the text that was hashed and its signature.',
	'check.full':
		'The full check, from the site root to every event, rule and calculation, is made by "gatehold verify FILE --root ROOT", and by opening the file in Archive.',
	'check.digest':
		'Record digest {code}: the SHA-256 of manifest.json, which names every attached file with its own hash.',
	'files.title': 'Attached files',
	'files.name': 'Name',
	'files.bytes': 'Bytes',
	'files.hash': 'SHA-256',
	'file.record': 'The start-up as signed events, one a line',
	'file.site': 'The site log that the start-up rests on, one event a line',
	'file.procedure': 'The procedure revision that was followed',
	'file.plant': 'The plant description that was used',
	'file.root': 'The certificate of the site root',
	'file.certificates': 'Certificates of the people and tablets',
	'file.attachment': '{name}, named by its hash in the record',
	'file.manifest': 'Every attached file with its hash, and what the dossier was written from',
	'cautions.title': 'Cautions',
	'cautions.computes':
		'The tool that wrote this file records and computes. It trips nothing, interlocks nothing and replaces no burner management, safety instrumented system, gas detector or permit. Plant procedures, local codes and licensed practice come first.',
	'cautions.gas':
		'Nitrogen and carbon dioxide asphyxiate without warning; carbon monoxide poisons. No entry without a permit and a gas test.',
	'cautions.ignition':
		'Tablets and phones are ignition sources: in a classified dust or gas zone only equipment approved for that zone.',
	'cautions.adequate':
		'A calculated \u201cadequate\u201d is a statement about readings and a model, not permission: the release is a person\u2019s.',
	'cautions.electronic':
		'Signatures are electronic signatures under the site\u2019s own root; they are not qualified signatures in the sense of eIDAS. That the file is unchanged does not show that readings, clocks or people were right.',
} as const;
