-- Order of names and numbers as people read them: letters before case, digits by their worth (RTU-2 before RTU-10).
-- Unicode locale extension kn: https://www.unicode.org/reports/tr35/tr35-collation.html#Setting_Options
CREATE COLLATION reading_order (provider = icu, locale = 'und-u-kn-true');
