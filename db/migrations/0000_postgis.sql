-- The geometry type and its indexes. Comes before everything else.
CREATE EXTENSION IF NOT EXISTS postgis;
