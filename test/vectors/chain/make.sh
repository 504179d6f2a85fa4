#!/bin/sh
# Makes every certificate of this folder again, with OpenSSL alone. Keys are thrown away.
set -eu
cd "$(dirname "$0")"
keys=$(mktemp -d)
trap 'rm -rf "$keys"' EXIT

p256() { openssl ecparam -name prime256v1 -genkey -noout -out "$keys/$1.key"; }

# root NAME SUBJECT EXTENSIONS...: a certificate signed with its own key
root() {
	name=$1 subject=$2
	shift 2
	openssl req -new -x509 -days 7300 -sha256 -key "$keys/$name.key" -subj "$subject" -out "$name.pem" "$@"
}

# issue NAME ISSUER SUBJECT DIGEST EXTENSIONS: a certificate signed with the key of ISSUER
issue() {
	openssl req -new -key "$keys/$1.key" -subj "$3" -out "$keys/$1.csr"
	printf '%b' "subjectKeyIdentifier=hash\nauthorityKeyIdentifier=keyid\n$5\n" >"$keys/$1.ext"
	openssl x509 -req -days 7000 "-$4" -in "$keys/$1.csr" -CA "$2.pem" -CAkey "$keys/$2.key" -extfile "$keys/$1.ext" -out "$1.pem"
}

person() { echo "/CN=Ada Example/UID=P-01/title=technician/0.9.2342.19200300.100.1.9=T-1/O=Invented Lime Works"; }
signs='basicConstraints=critical,CA:FALSE\nkeyUsage=critical,digitalSignature,nonRepudiation'
issues='basicConstraints=critical,CA:TRUE,pathlen:0\nkeyUsage=critical,keyCertSign,cRLSign'

for key in root good registrar under-registrar by-a-person unknown-extension encipherment second-registrar under-second false-root narrow-root narrow-registrar under-narrow crl-registrar under-crl; do p256 "$key"; done
openssl genrsa -out "$keys/rsa-signer.key" 2048
openssl ecparam -name secp384r1 -genkey -noout -out "$keys/p384-signer.key"
p256 sha1

root root '/CN=Invented Lime Works' -addext 'basicConstraints=critical,CA:TRUE,pathlen:1' -addext 'keyUsage=critical,keyCertSign,cRLSign'
root false-root '/CN=Invented Lime Works' -addext 'basicConstraints=critical,CA:TRUE,pathlen:1' -addext 'keyUsage=critical,keyCertSign,cRLSign'

root narrow-root '/CN=Narrow Lime Works' -addext 'basicConstraints=critical,CA:TRUE,pathlen:0' -addext 'keyUsage=critical,keyCertSign,cRLSign'

issue good root "$(person)" sha256 "$signs"
issue registrar root '/CN=Registrar' sha256 "$issues"
issue under-registrar registrar "$(person)" sha256 "$signs"
issue second-registrar registrar '/CN=Second Registrar' sha256 "$issues"
issue under-second second-registrar "$(person)" sha256 "$signs"
issue narrow-registrar narrow-root '/CN=Narrow Registrar' sha256 "$issues"
issue under-narrow narrow-registrar "$(person)" sha256 "$signs"
issue crl-registrar root '/CN=Registrar of revocations' sha256 'basicConstraints=critical,CA:TRUE,pathlen:0\nkeyUsage=critical,cRLSign'
issue under-crl crl-registrar "$(person)" sha256 "$signs"
issue by-a-person good "$(person)" sha256 "$signs"
issue unknown-extension root "$(person)" sha256 "$signs\n1.2.3.4=critical,ASN1:UTF8String:obey"
issue encipherment root "$(person)" sha256 'basicConstraints=critical,CA:FALSE\nkeyUsage=critical,keyEncipherment'
issue rsa-signer root "$(person)" sha256 "$signs"
issue p384-signer root "$(person)" sha256 "$signs"
issue sha1 root "$(person)" sha1 "$signs"
