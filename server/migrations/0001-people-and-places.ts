/** Accounts, their sites and designations, one-time links, sessions, and repeat answers. */
export const name = '0001-people-and-places';

export const up = [
  `CREATE TABLE sites (
    id INT UNSIGNED AUTO_INCREMENT PRIMARY KEY,
    name VARCHAR(80) NOT NULL UNIQUE,
    time_zone VARCHAR(64) NOT NULL,
    rule_sets JSON NOT NULL,
    created_at DATETIME(3) NOT NULL
  )`,
  `CREATE TABLE locations (
    id INT UNSIGNED AUTO_INCREMENT PRIMARY KEY,
    site_id INT UNSIGNED NOT NULL,
    name VARCHAR(80) NOT NULL,
    purpose VARCHAR(20) CHARACTER SET ascii NOT NULL,
    created_at DATETIME(3) NOT NULL,
    UNIQUE KEY (site_id, name),
    FOREIGN KEY (site_id) REFERENCES sites (id)
  )`,
  `CREATE TABLE users (
    id INT UNSIGNED AUTO_INCREMENT PRIMARY KEY,
    email VARCHAR(254) NOT NULL UNIQUE,
    name VARCHAR(120) NOT NULL,
    password_hash VARCHAR(255) NULL,
    roles JSON NOT NULL,
    ends_on DATE NULL,
    load_unit VARCHAR(20) CHARACTER SET ascii NOT NULL DEFAULT 'kg',
    length_unit VARCHAR(20) CHARACTER SET ascii NOT NULL DEFAULT 'm',
    created_at DATETIME(3) NOT NULL
  )`,
  `CREATE TABLE user_sites (
    user_id INT UNSIGNED NOT NULL,
    site_id INT UNSIGNED NOT NULL,
    PRIMARY KEY (user_id, site_id),
    FOREIGN KEY (user_id) REFERENCES users (id),
    FOREIGN KEY (site_id) REFERENCES sites (id)
  )`,
  `CREATE TABLE designations (
    id INT UNSIGNED AUTO_INCREMENT PRIMARY KEY,
    user_id INT UNSIGNED NOT NULL,
    kinds JSON NOT NULL,
    designated_by VARCHAR(120) NOT NULL,
    designated_on DATE NOT NULL,
    until_on DATE NULL,
    is_qualified BOOLEAN NOT NULL,
    ended_at DATETIME(3) NULL,
    created_at DATETIME(3) NOT NULL,
    KEY (user_id),
    FOREIGN KEY (user_id) REFERENCES users (id)
  )`,
  `CREATE TABLE invitations (
    id INT UNSIGNED AUTO_INCREMENT PRIMARY KEY,
    user_id INT UNSIGNED NOT NULL,
    token_hash CHAR(64) CHARACTER SET ascii NOT NULL UNIQUE,
    expires_at DATETIME(3) NOT NULL,
    used_at DATETIME(3) NULL,
    created_at DATETIME(3) NOT NULL,
    KEY (user_id),
    FOREIGN KEY (user_id) REFERENCES users (id)
  )`,
  `CREATE TABLE sessions (
    sid VARCHAR(64) CHARACTER SET ascii PRIMARY KEY,
    user_id INT UNSIGNED NULL,
    expires DATETIME(3) NOT NULL,
    data TEXT NOT NULL,
    created_at DATETIME(3) NOT NULL,
    updated_at DATETIME(3) NOT NULL,
    KEY (expires),
    KEY (user_id)
  )`,
  `CREATE TABLE idempotency_keys (
    scope VARCHAR(60) CHARACTER SET ascii NOT NULL,
    idempotency_key VARCHAR(128) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    fingerprint CHAR(64) CHARACTER SET ascii NOT NULL,
    status SMALLINT UNSIGNED NOT NULL DEFAULT 0,
    body MEDIUMTEXT NULL,
    created_at DATETIME(3) NOT NULL,
    PRIMARY KEY (scope, idempotency_key),
    KEY (created_at)
  )`,
  `CREATE TABLE files (
    id CHAR(36) CHARACTER SET ascii PRIMARY KEY,
    sha256 CHAR(64) CHARACTER SET ascii NOT NULL,
    original_sha256 CHAR(64) CHARACTER SET ascii NOT NULL,
    content_type VARCHAR(40) CHARACTER SET ascii NOT NULL,
    size INT UNSIGNED NOT NULL,
    original_name VARCHAR(255) NOT NULL,
    created_by INT UNSIGNED NULL,
    public_code CHAR(10) CHARACTER SET ascii NULL,
    created_at DATETIME(3) NOT NULL,
    KEY (sha256)
  )`,
];
