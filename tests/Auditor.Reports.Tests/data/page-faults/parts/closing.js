let text = "</script><img>";
