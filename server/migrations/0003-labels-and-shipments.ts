/** Tags with their print runs; evaluators and shipments. */
export const name = '0003-labels-and-shipments';

export const up = [
  `CREATE TABLE label_runs (
    id INT UNSIGNED AUTO_INCREMENT PRIMARY KEY,
    stock VARCHAR(60) CHARACTER SET ascii NOT NULL,
    start_at INT UNSIGNED NOT NULL,
    warnings JSON NOT NULL,
    created_by INT UNSIGNED NOT NULL,
    created_by_name VARCHAR(120) NOT NULL,
    created_at DATETIME(3) NOT NULL
  )`,
  `CREATE TABLE tags (
    code CHAR(10) CHARACTER SET ascii PRIMARY KEY,
    sling_id INT UNSIGNED NOT NULL,
    status VARCHAR(10) CHARACTER SET ascii NOT NULL,
    payload VARCHAR(200) CHARACTER SET ascii NOT NULL,
    qr_level CHAR(1) CHARACTER SET ascii NOT NULL,
    qr_version TINYINT UNSIGNED NOT NULL,
    qr_mask TINYINT UNSIGNED NOT NULL,
    run_id INT UNSIGNED NOT NULL,
    run_position INT UNSIGNED NOT NULL,
    reprint_reason VARCHAR(20) CHARACTER SET ascii NULL,
    printed_at DATETIME(3) NOT NULL,
    confirmed_at DATETIME(3) NULL,
    confirmed_by INT UNSIGNED NULL,
    confirmed_via VARCHAR(10) CHARACTER SET ascii NULL,
    voided_at DATETIME(3) NULL,
    void_reason VARCHAR(40) CHARACTER SET ascii NULL,
    live_key INT UNSIGNED AS (IF(status = 'live', sling_id, NULL)) PERSISTENT,
    printed_key INT UNSIGNED AS (IF(status = 'printed', sling_id, NULL)) PERSISTENT,
    CONSTRAINT tags_status CHECK (status IN ('printed', 'live', 'void')),
    UNIQUE KEY tags_one_live (live_key),
    UNIQUE KEY tags_one_printed (printed_key),
    UNIQUE KEY tags_run (run_id, run_position),
    KEY tags_sling (sling_id),
    FOREIGN KEY (sling_id) REFERENCES slings (id),
    FOREIGN KEY (run_id) REFERENCES label_runs (id)
  )`,
  `CREATE TABLE evaluators (
    id INT UNSIGNED AUTO_INCREMENT PRIMARY KEY,
    name VARCHAR(120) NOT NULL UNIQUE,
    email VARCHAR(254) NOT NULL,
    is_maker BOOLEAN NOT NULL,
    may_repair JSON NOT NULL,
    created_at DATETIME(3) NOT NULL
  )`,
  `CREATE TABLE shipments (
    id INT UNSIGNED AUTO_INCREMENT PRIMARY KEY,
    evaluator_id INT UNSIGNED NOT NULL,
    site_id INT UNSIGNED NOT NULL,
    expected_back_on DATE NOT NULL,
    created_by INT UNSIGNED NOT NULL,
    created_at DATETIME(3) NOT NULL,
    sent_at DATETIME(3) NULL,
    FOREIGN KEY (evaluator_id) REFERENCES evaluators (id),
    FOREIGN KEY (site_id) REFERENCES sites (id)
  )`,
  `CREATE TABLE shipment_lines (
    id INT UNSIGNED AUTO_INCREMENT PRIMARY KEY,
    shipment_id INT UNSIGNED NOT NULL,
    sling_id INT UNSIGNED NOT NULL,
    purpose VARCHAR(20) CHARACTER SET ascii NOT NULL,
    note TEXT NOT NULL,
    sent_seq INT UNSIGNED NULL,
    outcome VARCHAR(20) CHARACTER SET ascii NULL,
    outcome_at DATETIME(3) NULL,
    report_file_id CHAR(36) CHARACTER SET ascii NULL,
    repairer VARCHAR(120) NULL,
    proof_load_kg DECIMAL(13,5) NULL,
    vertical_kg DECIMAL(13,5) NULL,
    rated_loads JSON NULL,
    UNIQUE KEY (shipment_id, sling_id),
    KEY (sling_id, sent_seq),
    FOREIGN KEY (shipment_id) REFERENCES shipments (id),
    FOREIGN KEY (sling_id) REFERENCES slings (id)
  )`,
];
