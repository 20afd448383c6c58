# any quantity, in any unit, at any state; a figure that a gas does not have is told
printf 'id;CH4 [%%];H2 (mol %%);N2\na;98;0;2\nb;0;100;0\n' |
    bluecone stream --at 0/0 --unit kWh/m3 --add hhv,wobbe-gross,hydrogen-carbon-ratio,methane-number --digits 5
