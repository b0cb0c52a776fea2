let plain = 1;
