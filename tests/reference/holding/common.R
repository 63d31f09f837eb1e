# Reads the pulls and works out what is known of each before any effect, from the published figures and not from the program.
exponent <- c("soft-mud" = 0.92, "firm-mud" = 0.92, "silt" = 0.92, "weed-over-mud" = 0.92, "sandy-mud" = 0.86)
uplift <- function(deg) approx(c(0, 5, 10, 15, 25), c(1, 0.75, 0.60, 0.41, 0.10), deg, rule = 2)$y

read_pulls <- function(name) {
  d <- read.csv(name, stringsAsFactors = FALSE)
  b <- ifelse(d$seabed %in% names(exponent), exponent[d$seabed], 0.80)
  d$lnm <- log(d$massKg / 15)
  d$known <- b * d$lnm + log(uplift(d$shankAngleDeg))
  d$modification[is.na(d$modification)] <- ""
  d
}
