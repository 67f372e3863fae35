-- People read device 10 after device 9, not between 1 and 2.
create collation natural_order (provider = icu, locale = 'en-u-kn');
