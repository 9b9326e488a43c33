-- Parts of an instrument measured by themselves: where its frets stand, where its pickups stand and
-- how high. Only ever added to; the newest measuring holds, the older ones are the log.

CREATE TABLE fret_measuring (
  action_sequence  BIGINT NOT NULL,
  instrument_id    UUID NOT NULL,
  measured_at      TIMESTAMP(6) WITH TIME ZONE NOT NULL,
  scale_mm         DOUBLE PRECISION NOT NULL,
  CONSTRAINT fret_measuring_key PRIMARY KEY (action_sequence),
  CONSTRAINT fret_measuring_action FOREIGN KEY (action_sequence) REFERENCES action (sequence),
  CONSTRAINT fret_measuring_instrument FOREIGN KEY (instrument_id) REFERENCES instrument (id)
);
CREATE INDEX fret_measuring_by_instrument ON fret_measuring (instrument_id);

CREATE TABLE fret_place (
  action_sequence  BIGINT NOT NULL,
  item             INTEGER NOT NULL,
  fret             INTEGER NOT NULL,
  from_nut_mm      DOUBLE PRECISION NOT NULL,
  typed            VARCHAR(1000) NOT NULL,
  CONSTRAINT fret_place_key PRIMARY KEY (action_sequence, item),
  CONSTRAINT fret_place_fret UNIQUE (action_sequence, fret),
  CONSTRAINT fret_place_measuring FOREIGN KEY (action_sequence)
    REFERENCES fret_measuring (action_sequence)
);

CREATE TABLE pickup_measuring (
  action_sequence  BIGINT NOT NULL,
  instrument_id    UUID NOT NULL,
  measured_at      TIMESTAMP(6) WITH TIME ZONE NOT NULL,
  CONSTRAINT pickup_measuring_key PRIMARY KEY (action_sequence),
  CONSTRAINT pickup_measuring_action FOREIGN KEY (action_sequence) REFERENCES action (sequence),
  CONSTRAINT pickup_measuring_instrument FOREIGN KEY (instrument_id) REFERENCES instrument (id)
);
CREATE INDEX pickup_measuring_by_instrument ON pickup_measuring (instrument_id);

CREATE TABLE pickup (
  action_sequence  BIGINT NOT NULL,
  item             INTEGER NOT NULL,
  name             VARCHAR(1000) NOT NULL,
  from_bridge_mm   DOUBLE PRECISION NOT NULL,
  treble_mm        DOUBLE PRECISION,
  bass_mm          DOUBLE PRECISION,
  CONSTRAINT pickup_key PRIMARY KEY (action_sequence, item),
  CONSTRAINT pickup_measuring_of FOREIGN KEY (action_sequence)
    REFERENCES pickup_measuring (action_sequence)
);
